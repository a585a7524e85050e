/** Each piece kind as its two files, SVG and DXF. Outlines are made once for each way the edges can be. */
import type { Outline } from '@shared/geometry/outline';
import { centrePath, cutterFit } from '@shared/joint/cutter-fit';
import type { Layout } from '@shared/layout/schema';
import type { PieceKind } from '@shared/pieces/piece-kind';
import { edgesKey, tileOutline } from '@shared/pieces/tile-outline';
import type { LengthUnit } from '@shared/units/length';
import type { DxfDrawing, DxfOutline, LayerName } from './dxf/drawing';
import { printDxf, type DxfRelease } from './dxf/print-dxf';
import { pieceSvg } from './svg/piece-svg';
import type { BundleFile } from './zip/zip-files';

/** What is chosen about the outlines. */
export interface PieceFileOptions {
  readonly dxf: DxfRelease;
  readonly unit: LengthUnit;
  /** Whether the cutter's centre line is drawn too, on its own layer. */
  readonly centrePath: boolean;
}

/** What became of a wish for the centre path. */
export type CentrePathOutcome = 'drawn' | 'left out: the cutter does not fit';

export interface PieceFiles {
  readonly kind: PieceKind;
  readonly files: readonly BundleFile[];
  /** Null when no centre path was asked for. */
  readonly centrePath: CentrePathOutcome | null;
}

/** The files of every kind, in the order of the kinds. */
export function pieceFiles(
  layout: Layout,
  kinds: readonly PieceKind[],
  options: PieceFileOptions,
): PieceFiles[] {
  const drawn = new Map<string, DrawnOutline>();
  const digits = Math.max(2, String(kinds.length).length);
  return kinds.map((kind) => {
    const key = edgesKey(kind.edges);
    const outline = drawn.get(key) ?? drawnOutline(layout, kind, options);
    drawn.set(key, outline);
    return filesOf(layout, kind, outline, options, String(kind.number).padStart(digits, '0'));
  });
}

interface DrawnOutline {
  readonly outline: Outline;
  /** Null when not asked for, or when the cutter does not fit. */
  readonly path: Outline | null;
}

function drawnOutline(layout: Layout, kind: PieceKind, options: PieceFileOptions): DrawnOutline {
  const outline = tileOutline(layout, kind.edges);
  const { diameter } = layout.cutter;
  if (!options.centrePath || !cutterFit(outline, diameter).fits) return { outline, path: null };
  const path = centrePath(outline, diameter);
  return { outline, path: path.ok ? path.outline : null };
}

function filesOf(
  layout: Layout,
  kind: PieceKind,
  { outline, path }: DrawnOutline,
  options: PieceFileOptions,
  number: string,
): PieceFiles {
  const wood = layout.woods[kind.wood];
  const title = `${number} ${wood?.name ?? ''}`;
  const name = `outlines/${number}-${wood?.key ?? ''}`;
  const drawing = drawingOf(layout, `${title} (${options.unit})`, { outline, path }, options);
  return {
    kind,
    files: [
      {
        path: `${name}.svg`,
        text: pieceSvg({ outline, title, colour: wood?.colour ?? '#000000' }),
      },
      { path: `${name}.dxf`, text: printDxf(drawing, options.dxf) },
    ],
    centrePath: !options.centrePath ? null : path ? 'drawn' : 'left out: the cutter does not fit',
  };
}

function drawingOf(
  { shell }: Layout,
  text: string,
  { outline, path }: DrawnOutline,
  options: PieceFileOptions,
): DxfDrawing {
  const part: DxfOutline = { layer: 'PART', outline };
  const centreLayer: LayerName[] = options.centrePath ? ['CENTRE_PATH'] : [];
  return {
    unit: options.unit,
    layers: ['PART', ...centreLayer, 'LABEL', 'BOARD'],
    outlines: path ? [part, { layer: 'CENTRE_PATH', outline: path }] : [part],
    labels: [
      {
        layer: 'LABEL',
        at: { x: 0, y: 0 },
        height: Math.min(shell.tileWidth, shell.tileHeight) / 12,
        text,
      },
    ],
  };
}
