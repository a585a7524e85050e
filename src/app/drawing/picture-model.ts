/**
 * A picture as data: what to draw, in pixels, before any of it is painted. Geometry stays in millimetres
 * with true arcs and is placed by a `View`; words and dimension lines are laid out in pixels, so that they
 * stay readable at any scale.
 */
import type { Segment } from '@shared/geometry/segment';
import type { Millimetres, PointMm } from '@shared/units/length';
import { luminanceOf } from '@shared/wood/luminance';

/** A point of the picture, y down. */
export interface PixelPoint {
  readonly x: number;
  readonly y: number;
}

export interface PixelSize {
  readonly width: number;
  readonly height: number;
}

/** Where millimetres lie in the picture: y up in millimetres, down in pixels. */
export interface View {
  readonly pixelsPerMm: number;
  /** Pixel of the millimetre origin. */
  readonly origin: PixelPoint;
}

/** How something looks; each is a class in picture.scss. */
export type Look =
  | 'wood'
  | 'thin'
  | 'pale'
  | 'dark'
  | 'dashed'
  | 'halo'
  | 'turned'
  | 'seam'
  | 'trim'
  | 'cutter'
  | 'cutter-stopped'
  | 'rim'
  | 'ground';

export type TextLook = 'figure' | 'label' | 'teal' | 'stop' | 'on-dark' | 'on-light' | 'quiet';

/** A wood to fill an outline with; its grain runs upright in the picture. */
export interface WoodFill {
  readonly colour: string;
  /** Width of one strip of grain, or null to draw none. */
  readonly grain: { readonly left: Millimetres; readonly strip: Millimetres } | null;
  /** Drawn a little darker, as a cut surface behind another. */
  readonly shade?: 'shaded';
}

export type Mark =
  | {
      readonly kind: 'path';
      readonly segments: readonly Segment[];
      readonly view: View;
      readonly look: Look;
      readonly wood?: WoodFill;
    }
  | {
      readonly kind: 'circle';
      readonly centre: PixelPoint;
      readonly radius: number;
      readonly look: Look;
    }
  | {
      readonly kind: 'line';
      readonly from: PixelPoint;
      readonly to: PixelPoint;
      readonly look: Look;
    }
  | {
      readonly kind: 'text';
      readonly at: PixelPoint;
      readonly text: string;
      readonly anchor: 'start' | 'middle' | 'end';
      readonly look: TextLook;
      /** Reads from bottom to top when upright. */
      readonly turn?: 'upright';
      /** Sets the words on a patch of paper, so that lines do not run through them. */
      readonly ground?: 'paper';
    }
  | {
      /** Marks seen through a round window. */
      readonly kind: 'lens';
      readonly centre: PixelPoint;
      readonly radius: number;
      readonly marks: readonly Mark[];
    }
  | {
      /** Marks cut off at a box. */
      readonly kind: 'window';
      readonly at: PixelPoint;
      readonly size: PixelSize;
      readonly marks: readonly Mark[];
    };

export interface Picture {
  /** What the picture shows, in a sentence, for those who do not see it. */
  readonly title: string;
  /** Words over the picture. */
  readonly caption: string;
  readonly marks: readonly Mark[];
}

/** The pixel of a point in millimetres. */
export function onScreen(view: View, point: PointMm): PixelPoint {
  return {
    x: view.origin.x + point.x * view.pixelsPerMm,
    y: view.origin.y - point.y * view.pixelsPerMm,
  };
}

/** A closed polygon as line segments. */
export function polygon(points: readonly PointMm[]): Segment[] {
  return points.map((from, i) => ({
    kind: 'line',
    from,
    to: points[(i + 1) % points.length] as PointMm,
  }));
}

/** A circle round a point, as one whole turn. */
export function circleMark(view: View, centre: PointMm, radius: Millimetres, look: Look): Mark {
  return {
    kind: 'circle',
    centre: onScreen(view, centre),
    radius: radius * view.pixelsPerMm,
    look,
  };
}

/** Whether words on this colour ("#RRGGBB") are read better in dark or in light ink (relative luminance, WCAG 2.2). */
export function inkOn(colour: string): 'on-dark' | 'on-light' {
  return luminanceOf(colour) < 0.24 ? 'on-dark' : 'on-light';
}
