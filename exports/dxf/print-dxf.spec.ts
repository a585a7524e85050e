import { describe, expect, it } from 'vitest';
import type { Outline } from '@shared/geometry/outline';
import type { DxfDrawing } from './drawing';
import { DXF_RELEASES, printDxf } from './print-dxf';
import { roundForDxf, verticesOf } from './vertices';

const outline: Outline = {
  segments: [
    { kind: 'line', from: { x: 0, y: 0 }, to: { x: 10, y: 0 } },
    { kind: 'arc', centre: { x: 10, y: 0 }, radius: 0, startAngle: 0, sweep: 1 },
    { kind: 'arc', centre: { x: 5, y: 0 }, radius: 5, startAngle: 0, sweep: Math.PI },
  ],
};
const drawing: DxfDrawing = {
  unit: 'mm',
  layers: ['PART', 'LABEL'],
  outlines: [{ layer: 'PART', outline }],
  labels: [{ layer: 'LABEL', at: { x: 5, y: 2 }, height: 1, text: '%%d ^J é\n' }],
};

describe('a drawing as DXF', () => {
  it('leaves out what has no length and bends what is an arc', () => {
    expect(verticesOf(outline, 'mm')).toEqual([
      { x: 0, y: 0, bulge: 0 },
      { x: 10, y: 0, bulge: 1 },
    ]);
  });

  it('scales coordinates to inches, never bulges', () => {
    expect(verticesOf(outline, 'in')[1]).toEqual({ x: 0.3937007874, y: 0, bulge: 1 });
  });

  it('draws a full circle in two halves', () => {
    const circle: Outline = {
      segments: [
        { kind: 'arc', centre: { x: 0, y: 0 }, radius: 3, startAngle: 0, sweep: 2 * Math.PI },
      ],
    };
    expect(verticesOf(circle, 'mm')).toEqual([
      { x: 3, y: 0, bulge: 1 },
      { x: -3, y: 0, bulge: 1 },
    ]);
  });

  it('prints next to nothing as 0', () => {
    expect(roundForDxf(-1e-12)).toBe(0);
    expect(String(roundForDxf(1.23e-6))).toBe('0.00000123');
  });

  it.each(DXF_RELEASES)('%s: one value a line, ASCII, the same each time', (release) => {
    const text = printDxf(drawing, release);
    expect(text).toBe(printDxf(drawing, release));
    expect(text).toMatch(/^[\x20-\x7e\r\n]*$/);
    expect(text.endsWith('EOF\r\n')).toBe(true);
    expect(text.split('\r\n').length % 2).toBe(1);
    expect(text).toContain('\r\n% %d \\U+005EJ \\U+00E9 \r\n');
    expect(text).not.toContain('\r\nCENTRE_PATH\r\n');
  });

  it('R12 says its unit in a comment, R2000 in $INSUNITS', () => {
    expect(printDxf(drawing, 'r12')).toMatch(/^999\r\nStaveloom: coordinates in millimetres\r\n/);
    expect(printDxf({ ...drawing, unit: 'in' }, 'r12')).toContain('coordinates in inches');
    expect(printDxf(drawing, 'r2000')).toContain('$INSUNITS\r\n70\r\n4\r\n');
    expect(printDxf({ ...drawing, unit: 'in' }, 'r2000')).toContain('$INSUNITS\r\n70\r\n1\r\n');
  });
});
