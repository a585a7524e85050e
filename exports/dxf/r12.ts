/**
 * DXF R12 (AC1009), for controllers that read nothing newer: POLYLINE with VERTEX bulges. Our own printer
 * of a few group codes, because a strict reader wants $ACADVER, the LTYPE and LAYER tables and a BLOCKS
 * section, and because outlines must keep their direction and their first vertex. R12 has no $INSUNITS:
 * the unit is said in a comment (group 999) at the head and by the label.
 */
import { fromMillimetres, type LengthUnit } from '@shared/units/length';
import { printDecimal } from '../decimal';
import { LAYER_COLOURS, type DxfDrawing, type DxfLabel, type DxfOutline } from './drawing';
import { dxfText } from './dxf-text';
import { BULGE_DECIMALS, DXF_DECIMALS, verticesOf } from './vertices';

const UNIT_NAMES: Record<LengthUnit, string> = { mm: 'millimetres', in: 'inches' };

/** A group code and its value. */
type Group = readonly [code: number, value: string | number];

/** The drawing as DXF R12: closed POLYLINEs with bulges, coordinates in the drawing's unit. */
export function printR12(drawing: DxfDrawing): string {
  const groups: Group[] = [
    [999, `Staveloom: coordinates in ${UNIT_NAMES[drawing.unit]}`],
    ...section('HEADER', [
      [9, '$ACADVER'],
      [1, 'AC1009'],
    ]),
    ...section('TABLES', [...lineTypeTable(), ...layerTable(drawing), ...styleTable()]),
    ...section('BLOCKS', []),
    ...section('ENTITIES', [
      ...drawing.outlines.flatMap((outline) => polyline(outline, drawing.unit)),
      ...drawing.labels.flatMap((label) => text(label, drawing.unit)),
    ]),
    [0, 'EOF'],
  ];
  return groups.map(([code, value]) => `${code}\r\n${value}\r\n`).join('');
}

function section(name: string, content: readonly Group[]): Group[] {
  return [[0, 'SECTION'], [2, name], ...content, [0, 'ENDSEC']];
}

function table(name: string, size: number, records: readonly Group[]): Group[] {
  return [[0, 'TABLE'], [2, name], [70, size], ...records, [0, 'ENDTAB']];
}

function lineTypeTable(): Group[] {
  return table('LTYPE', 1, [
    [0, 'LTYPE'],
    [2, 'CONTINUOUS'],
    [70, 0],
    [3, 'Solid line'],
    [72, 65],
    [73, 0],
    [40, 0],
  ]);
}

function layerTable({ layers }: DxfDrawing): Group[] {
  const named = layers.map((name) => ({ name, colour: LAYER_COLOURS[name] }));
  const records = [{ name: '0', colour: 7 }, ...named].flatMap(({ name, colour }): Group[] => [
    [0, 'LAYER'],
    [2, name],
    [70, 0],
    [62, colour],
    [6, 'CONTINUOUS'],
  ]);
  return table('LAYER', layers.length + 1, records);
}

function styleTable(): Group[] {
  return table('STYLE', 1, [
    [0, 'STYLE'],
    [2, 'STANDARD'],
    [70, 0],
    [40, 0],
    [41, 1],
    [50, 0],
    [71, 0],
    [42, 1],
    [3, 'txt'],
    [4, ''],
  ]);
}

function polyline({ layer, outline }: DxfOutline, unit: LengthUnit): Group[] {
  const vertices = verticesOf(outline, unit).flatMap(({ x, y, bulge }): Group[] => [
    [0, 'VERTEX'],
    [8, layer],
    ...pointGroups(x, y, 0),
    ...(bulge === 0 ? [] : [[42, printDecimal(bulge, BULGE_DECIMALS)] as const]),
  ]);
  return [
    [0, 'POLYLINE'],
    [8, layer],
    [66, 1],
    ...pointGroups(0, 0, 0),
    [70, 1],
    ...vertices,
    [0, 'SEQEND'],
    [8, layer],
  ];
}

/** Middle-centred text: group 72 = 1 with 73 = 2 takes its place from the second point (11, 21). */
function text({ layer, at, height, text: words }: DxfLabel, unit: LengthUnit): Group[] {
  const x = fromMillimetres(at.x, unit);
  const y = fromMillimetres(at.y, unit);
  return [
    [0, 'TEXT'],
    [8, layer],
    ...pointGroups(x, y, 0),
    [40, decimal(fromMillimetres(height, unit))],
    [1, dxfText(words)],
    [72, 1],
    ...pointGroups(x, y, 1),
    [73, 2],
  ];
}

function pointGroups(x: number, y: number, offset: 0 | 1): Group[] {
  return [
    [10 + offset, decimal(x)],
    [20 + offset, decimal(y)],
    [30 + offset, '0'],
  ];
}

function decimal(value: number): string {
  return printDecimal(value, DXF_DECIMALS);
}
