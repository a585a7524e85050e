import type { DxfDrawing } from './drawing';
import { printR12 } from './r12';
import { printR2000 } from './r2000';

export const DXF_RELEASES = ['r2000', 'r12'] as const;
export type DxfRelease = (typeof DXF_RELEASES)[number];

/** The drawing as the text of a DXF file: ASCII, lines ending in CR LF. */
export function printDxf(drawing: DxfDrawing, release: DxfRelease): string {
  return release === 'r12' ? printR12(drawing) : printR2000(drawing);
}
