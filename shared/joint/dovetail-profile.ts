/**
 * The dovetail: two flanks that lean out by the flank angle α from the square, filleted at the root and
 * rounded at the tip. Both corners measure 90° − α, so a radius r takes r / tan(45° − α/2) off each side.
 */
import type { ArcSegment, Segment } from '../geometry/segment';
import { endOf, startOf } from '../geometry/segment';
import { distance } from '../geometry/vector';
import { POINT_TOLERANCE } from '../geometry/tolerance';
import { toDegrees, toRadians } from '../units/angle';
import type { Millimetres } from '../units/length';
import type { DovetailParameters } from './parameters';
import type { ProfileShape } from './profile-shape';
import type { Refusal } from './refusal';

interface Corners {
  /** Half widths between the flanks drawn sharp, at the edge line and at the tip. */
  readonly rootHalf: Millimetres;
  readonly tipHalf: Millimetres;
  /** What the radii take off the sides of their corners. */
  readonly rootTangent: Millimetres;
  readonly tipTangent: Millimetres;
}

function cornersOf(parameters: DovetailParameters): Corners {
  const lean = toRadians(parameters.flankAngle);
  const perRadius = 1 / Math.tan(Math.PI / 4 - lean / 2);
  const rootHalf = parameters.rootWidth / 2;
  return {
    rootHalf,
    tipHalf: rootHalf + parameters.reach * Math.tan(lean),
    rootTangent: parameters.rootRadius * perRadius,
    tipTangent: parameters.tipRadius * perRadius,
  };
}

/** The dovetail tab. Call `dovetailRefusals` first: parameters that do not close give a crossed drawing. */
export function dovetailShape(parameters: DovetailParameters): ProfileShape {
  const { reach, rootRadius, tipRadius } = parameters;
  const lean = toRadians(parameters.flankAngle);
  const { rootHalf, tipHalf, rootTangent, tipTangent } = cornersOf(parameters);
  const shoulder = rootHalf + rootTangent;
  const turn = Math.PI / 2 + lean;
  const root = (side: -1 | 1): ArcSegment => ({
    kind: 'arc',
    centre: { x: side * shoulder, y: rootRadius },
    radius: rootRadius,
    startAngle: side < 0 ? -Math.PI / 2 : Math.PI - lean,
    sweep: turn,
  });
  const tip = (side: -1 | 1): ArcSegment => ({
    kind: 'arc',
    centre: { x: side * (tipHalf - tipTangent), y: reach - tipRadius },
    radius: tipRadius,
    startAngle: side < 0 ? Math.PI + lean : Math.PI / 2,
    sweep: -turn,
  });
  const [rootLeft, tipLeft, tipRight, rootRight] = [root(-1), tip(-1), tip(1), root(1)];
  const neck = 2 * (shoulder - rootRadius);
  const headWidth = 2 * (tipHalf - tipTangent + tipRadius);
  return {
    segments: [
      rootLeft,
      ...lineBetween(rootLeft, tipLeft),
      tipLeft,
      ...lineBetween(tipLeft, tipRight),
      tipRight,
      ...lineBetween(tipRight, rootRight),
      rootRight,
    ],
    shoulder,
    reach,
    neck,
    headWidth,
    undercut: (headWidth - neck) / 2,
    footRadius: rootRadius,
    headRadius: tipRadius,
  };
}

function lineBetween(before: Segment, after: Segment): Segment[] {
  const [from, to] = [endOf(before), startOf(after)];
  return distance(from, to) <= POINT_TOLERANCE ? [] : [{ kind: 'line', from, to }];
}

/** Why a dovetail with this clearance does not fit an edge of this length; empty when it does. */
export function dovetailRefusals(
  parameters: DovetailParameters,
  edgeLength: Millimetres,
  clearance: Millimetres,
): Refusal[] {
  const { rootWidth, reach, rootRadius, tipRadius } = parameters;
  const lean = toRadians(parameters.flankAngle);
  const inset = clearance / 2;
  const half = edgeLength / 2 - inset;
  const { rootHalf, tipHalf, rootTangent, tipTangent } = cornersOf(parameters);
  const refusals: Refusal[] = [];
  const refuse = (
    field: keyof DovetailParameters,
    limit: Refusal['limit'],
    value: number,
    because: string,
  ) => refusals.push({ field, limit, value, measure: 'length', because });

  const neckHalf = rootHalf + rootTangent - rootRadius;
  if (neckHalf <= inset) {
    refuse(
      'rootWidth',
      'least',
      rootWidth + 2 * (inset - neckHalf),
      'the clearance closes the neck',
    );
  }
  if (rootHalf + rootTangent > half) {
    const value = 2 * (half - rootTangent);
    const because = 'the root fillet must end before the corner of the tile';
    if (value > 0) refuse('rootWidth', 'most', value, because);
    else refuse('rootRadius', 'most', (half - rootHalf) / (rootTangent / rootRadius), because);
  }
  if (tipHalf >= half && refusals.length === 0) {
    const value = toDegrees(Math.atan((half - rootHalf) / reach));
    const because = 'the tips must stay within the tile';
    refusals.push({ field: 'flankAngle', limit: 'most', value, measure: 'angle', because });
  }
  const flank = reach / Math.cos(lean);
  if (rootTangent + tipTangent > flank) {
    const value = (rootTangent + tipTangent) * Math.cos(lean);
    refuse('reach', 'least', value, 'root fillet and rounded tip need that much flank');
  }
  if (tipTangent > tipHalf) {
    const value = (tipHalf * tipRadius) / tipTangent;
    refuse('tipRadius', 'most', value, 'the two rounded tips meet in the middle');
  }
  return refusals;
}
