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
import { LEAST_WOOD, SLACK, type Refusal } from './refusal';

interface Corners {
  /** Half widths between the flanks drawn sharp, at the edge line and at the tip. */
  readonly rootHalf: Millimetres;
  readonly tipHalf: Millimetres;
  /** What the radii take off the sides of their corners. */
  readonly rootTangent: Millimetres;
  readonly tipTangent: Millimetres;
}

function cornersOf(parameters: DovetailParameters): Corners {
  const rootHalf = parameters.rootWidth / 2;
  return {
    rootHalf,
    tipHalf: rootHalf + parameters.reach * Math.tan(toRadians(parameters.flankAngle)),
    rootTangent: parameters.rootRadius * perRadius(parameters),
    tipTangent: parameters.tipRadius * perRadius(parameters),
  };
}

/** What each millimetre of radius takes off the sides of a corner: 1 / tan(45° − α/2). */
function perRadius({ flankAngle }: DovetailParameters): number {
  return 1 / Math.tan(Math.PI / 4 - toRadians(flankAngle) / 2);
}

/** A root is never narrowed under this by a bound: a narrower one is no joint. */
const LEAST_ROOT_WIDTH: Millimetres = 0.5;

/** The dovetail tab. Call `dovetailRefusals` first: parameters that do not close give a crossed drawing. */
export function dovetailShape(parameters: DovetailParameters): ProfileShape {
  const { reach, rootRadius, tipRadius } = parameters;
  const { rootHalf, tipHalf, rootTangent, tipTangent } = cornersOf(parameters);
  const shoulder = rootHalf + rootTangent;
  const arcs = [
    rootArc(parameters, -1),
    tipArc(parameters, -1),
    tipArc(parameters, 1),
    rootArc(parameters, 1),
  ];
  const neck = 2 * (shoulder - rootRadius);
  const headWidth = 2 * (tipHalf - tipTangent + tipRadius);
  return {
    segments: arcs.flatMap((arc, i) => {
      const next = arcs[i + 1];
      return next ? [arc, ...lineBetween(arc, next)] : [arc];
    }),
    shoulder,
    reach,
    neck,
    headWidth,
    undercut: (headWidth - neck) / 2,
    footRadius: rootRadius,
    headRadius: tipRadius,
  };
}

/** The fillet at the root, left (−1) or right of the middle. */
function rootArc(parameters: DovetailParameters, side: -1 | 1): ArcSegment {
  const lean = toRadians(parameters.flankAngle);
  const { rootHalf, rootTangent } = cornersOf(parameters);
  return {
    kind: 'arc',
    centre: { x: side * (rootHalf + rootTangent), y: parameters.rootRadius },
    radius: parameters.rootRadius,
    startAngle: side < 0 ? -Math.PI / 2 : Math.PI - lean,
    sweep: Math.PI / 2 + lean,
  };
}

/** The rounded tip, left (−1) or right of the middle. */
function tipArc(parameters: DovetailParameters, side: -1 | 1): ArcSegment {
  const lean = toRadians(parameters.flankAngle);
  const { tipHalf, tipTangent } = cornersOf(parameters);
  return {
    kind: 'arc',
    centre: { x: side * (tipHalf - tipTangent), y: parameters.reach - parameters.tipRadius },
    radius: parameters.tipRadius,
    startAngle: side < 0 ? Math.PI + lean : Math.PI / 2,
    sweep: -(Math.PI / 2 + lean),
  };
}

function lineBetween(before: Segment, after: Segment): Segment[] {
  const [from, to] = [endOf(before), startOf(after)];
  return distance(from, to) <= POINT_TOLERANCE ? [] : [{ kind: 'line', from, to }];
}

/** What the refusals are worked out from. */
interface Fit {
  readonly parameters: DovetailParameters;
  readonly corners: Corners;
  readonly perRadius: number;
  /** c/2; an outside radius under it becomes a sharp corner, which takes as much as a radius of c/2. */
  readonly inset: Millimetres;
  /** Half the edge between the tile's other two sides. */
  readonly half: Millimetres;
}

/** Why a dovetail with this clearance does not fit an edge of this length; empty when it does. */
export function dovetailRefusals(
  parameters: DovetailParameters,
  edgeLength: Millimetres,
  clearance: Millimetres,
): Refusal[] {
  const inset = clearance / 2;
  const fit: Fit = {
    parameters,
    corners: cornersOf(parameters),
    perRadius: perRadius(parameters),
    inset,
    half: edgeLength / 2 - inset,
  };
  const refusals = [neckRefusal(fit), shoulderRefusal(fit), flankRefusal(fit), tipRefusal(fit)];
  const found = refusals.filter((refusal) => refusal !== null);
  const wide = found.length === 0 ? headRefusal(fit) : null;
  return wide ? [wide] : found;
}

function neckRefusal({ parameters, corners, inset }: Fit): Refusal | null {
  const neckHalf = corners.rootHalf + corners.rootTangent - parameters.rootRadius;
  const short = inset + LEAST_WOOD / 2 - neckHalf;
  if (short <= SLACK) return null;
  const value = parameters.rootWidth + 2 * short;
  return lengthRefusal('rootWidth', 'least', value, 'the clearance closes the neck');
}

function shoulderRefusal({ parameters, corners, perRadius, inset, half }: Fit): Refusal | null {
  const foot = Math.max(parameters.rootRadius, inset);
  if (corners.rootHalf + foot * perRadius <= half + SLACK) return null;
  const because = 'the root fillet must end before the corner of the tile';
  const widthMost = 2 * (half - foot * perRadius);
  if (widthMost >= LEAST_ROOT_WIDTH) {
    return lengthRefusal('rootWidth', 'most', widthMost, because);
  }
  const radiusMost = (half - corners.rootHalf) / perRadius;
  if (radiusMost >= inset) return lengthRefusal('rootRadius', 'most', radiusMost, because);
  // no radius is small enough: the lips that the clearance sharpens take what the edge has
  const narrowed = 2 * (half - inset * perRadius);
  if (narrowed >= LEAST_ROOT_WIDTH) return lengthRefusal('rootWidth', 'most', narrowed, because);
  const room = Math.max(half - corners.rootHalf, inset);
  const steepest = 90 - 2 * toDegrees(Math.atan(inset / room));
  return { field: 'flankAngle', limit: 'most', value: steepest, measure: 'angle', because };
}

/** Both radii share one flank; the clearance makes one of them larger by c/2 and the other smaller. */
function flankRefusal({ parameters, perRadius, inset }: Fit): Refusal | null {
  const { reach, rootRadius, tipRadius, flankAngle } = parameters;
  const radii = Math.max(rootRadius + tipRadius, rootRadius + inset, tipRadius + inset);
  const value = radii * perRadius * Math.cos(toRadians(flankAngle));
  if (reach >= value - SLACK) return null;
  const because = 'root fillet and rounded tip need that much flank';
  return lengthRefusal('reach', 'least', value, because);
}

/** A tip sharpened by the clearance never meets the other: neck and flank leave it room. */
function tipRefusal({ parameters, corners, perRadius }: Fit): Refusal | null {
  const radiusMost = corners.tipHalf / perRadius;
  if (parameters.tipRadius <= radiusMost + SLACK) return null;
  return lengthRefusal('tipRadius', 'most', radiusMost, 'the two rounded tips meet in the middle');
}

/** The socket is wider than the head by c/2, and the tile's other sides stand back by c/2. */
function headRefusal({ parameters, corners, inset, half }: Fit): Refusal | null {
  const { rootWidth, flankAngle, tipRadius, reach } = parameters;
  const over = corners.tipHalf - corners.tipTangent + tipRadius - (half - inset);
  if (over <= SLACK) return null;
  const because = 'the tips must stay within the tile';
  const widthMost = rootWidth - 2 * over;
  return widthMost >= LEAST_ROOT_WIDTH
    ? lengthRefusal('rootWidth', 'most', widthMost, because)
    : lengthRefusal('reach', 'most', reach - over / Math.tan(toRadians(flankAngle)), because);
}

function lengthRefusal(
  field: keyof DovetailParameters,
  limit: Refusal['limit'],
  value: Millimetres,
  because: string,
): Refusal {
  return { field, limit, value, measure: 'length', because };
}
