import {
  DxfWriter,
  LWPolylineFlags,
  TextHorizontalAlignment,
  TextVerticalAlignment,
  Units,
  point3d,
} from '@tarikjabiri/dxf';
import { fromMillimetres, type LengthUnit } from '@shared/units/length';
import { LAYER_COLOURS, type DxfDrawing, type DxfLabel } from './drawing';
import { dxfText } from './dxf-text';
import { roundForDxf, verticesOf } from './vertices';

/**
 * The drawing as DXF R2000 (AC1015): closed LWPOLYLINEs with bulges, `$INSUNITS` 4 (mm) or 1 (inch).
 * Handles count from 1 in every file, so the same drawing gives the same bytes.
 */
export function printR2000(drawing: DxfDrawing): string {
  const writer = new DxfWriter();
  writer.setVariable('$ACADVER', { 1: 'AC1015' });
  writer.setVariable('$DWGCODEPAGE', { 3: 'ANSI_1252' });
  writer.setVariable('$LASTSAVEDBY', { 1: 'Staveloom' });
  writer.setVariable('$MEASUREMENT', { 70: drawing.unit === 'mm' ? 1 : 0 });
  writer.setUnits(drawing.unit === 'mm' ? Units.Millimeters : Units.Inches);
  for (const layer of drawing.layers) writer.addLayer(layer, LAYER_COLOURS[layer], 'Continuous');
  for (const { layer, outline } of drawing.outlines) {
    const vertices = verticesOf(outline, drawing.unit).map(({ x, y, bulge }) => ({
      point: { x, y },
      ...(bulge === 0 ? {} : { bulge }),
    }));
    writer.addLWPolyline(vertices, { layerName: layer, flags: LWPolylineFlags.Closed });
  }
  for (const label of drawing.labels) addLabel(writer, label, drawing.unit);
  return `${writer.stringify()}\n`.replaceAll('\n', '\r\n');
}

function addLabel(writer: DxfWriter, label: DxfLabel, unit: LengthUnit): void {
  const at = point3d(
    roundForDxf(fromMillimetres(label.at.x, unit)),
    roundForDxf(fromMillimetres(label.at.y, unit)),
  );
  writer.addText(at, roundForDxf(fromMillimetres(label.height, unit)), dxfText(label.text), {
    layerName: label.layer,
    horizontalAlignment: TextHorizontalAlignment.Center,
    verticalAlignment: TextVerticalAlignment.Middle,
    secondAlignmentPoint: at,
  });
}
