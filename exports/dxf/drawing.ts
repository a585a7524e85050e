/**
 * What a DXF file says, before it is printed: closed outlines and one-line labels on layers, all in
 * millimetres. The two printers (r2000.ts, r12.ts) turn it into the reader's unit.
 */
import type { Outline } from '@shared/geometry/outline';
import type { LengthUnit, Millimetres, PointMm } from '@shared/units/length';

/** The layers, with their AutoCAD colour index: white, red, green, grey. */
export const LAYER_COLOURS = { PART: 7, CENTRE_PATH: 1, LABEL: 3, BOARD: 8 } as const;
export type LayerName = keyof typeof LAYER_COLOURS;

/** One line of text, its middle at a point. */
export interface DxfLabel {
  readonly layer: LayerName;
  readonly at: PointMm;
  readonly height: Millimetres;
  readonly text: string;
}

/** A closed outline on a layer. */
export interface DxfOutline {
  readonly layer: LayerName;
  readonly outline: Outline;
}

export interface DxfDrawing {
  /** The unit the file's coordinates are written in. */
  readonly unit: LengthUnit;
  /** Layers the file declares, whether or not something lies on them. */
  readonly layers: readonly LayerName[];
  readonly outlines: readonly DxfOutline[];
  readonly labels: readonly DxfLabel[];
}
