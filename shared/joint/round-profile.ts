/**
 * The round profile: a head circle on two fillet circles, all tangent. With h = reach − r_h the fillet
 * centres lie at (±x_f, r_f), x_f² = (r_h + r_f)² − (h − r_f)², since a fillet touches the edge line and,
 * from outside, the head (tangent circles: the distance of the centres is the sum of the radii).
 */
import type { ArcSegment } from '../geometry/segment';
import type { Millimetres } from '../units/length';
import type { RoundParameters } from './parameters';
import type { ProfileShape } from './profile-shape';
import { LEAST_WOOD, SLACK, type Refusal } from './refusal';

/** Height of the head's centre over the edge line, mm. */
export function headHeight(parameters: RoundParameters): Millimetres {
  return parameters.reach - parameters.headRadius;
}

/** x_f², mm²: the square of the fillet centres' distance from the middle; negative when it does not close. */
function filletCentreSquared({ headRadius, filletRadius, reach }: RoundParameters): number {
  // (r_h + r_f)² − (h − r_f)² with h = reach − r_h, multiplied out so that nothing cancels
  return reach * (2 * headRadius + 2 * filletRadius - reach);
}

/** True when the head stands too low to lock: h ≤ r_f, a wave without a neck. */
export function isWave(parameters: RoundParameters): boolean {
  return headHeight(parameters) <= parameters.filletRadius;
}

/** The round tab. Call `roundRefusals` first: parameters that do not close give NaN. */
export function roundShape(parameters: RoundParameters): ProfileShape {
  const { headRadius, filletRadius, reach } = parameters;
  const height = headHeight(parameters);
  const shoulder = Math.sqrt(filletCentreSquared(parameters));
  const lean = Math.atan2(height - filletRadius, shoulder);
  const fillet = (side: -1 | 1): ArcSegment => ({
    kind: 'arc',
    centre: { x: side * shoulder, y: filletRadius },
    radius: filletRadius,
    startAngle: side < 0 ? -Math.PI / 2 : Math.PI - lean,
    sweep: Math.PI / 2 + lean,
  });
  const head: ArcSegment = {
    kind: 'arc',
    centre: { x: 0, y: height },
    radius: headRadius,
    startAngle: Math.PI + lean,
    sweep: -(Math.PI + 2 * lean),
  };
  const wave = isWave(parameters);
  const neck = wave ? 2 * headRadius * Math.cos(lean) : 2 * (shoulder - filletRadius);
  return {
    segments: [fillet(-1), head, fillet(1)],
    shoulder,
    reach,
    neck,
    headWidth: wave ? neck : 2 * headRadius,
    undercut: wave ? 0 : headRadius - neck / 2,
    footRadius: filletRadius,
    headRadius,
  };
}

/** Why a round tab with this clearance does not fit an edge of this length; empty when it does. */
export function roundRefusals(
  parameters: RoundParameters,
  edgeLength: Millimetres,
  clearance: Millimetres,
): Refusal[] {
  const { headRadius, filletRadius, reach } = parameters;
  const inset = clearance / 2;
  const headLeast = inset + LEAST_WOOD;
  if (headRadius < headLeast - SLACK) {
    return [
      least('headRadius', headLeast, 'the clearance takes half its width off the whole head'),
    ];
  }
  if (!isWave(parameters)) {
    // the socket is wider than the head by c/2, and the tile's other sides stand back by c/2
    const headMost = edgeLength / 2 - clearance;
    if (headRadius > headMost + SLACK) {
      return [most('headRadius', headMost, 'the head must stay within the tile')];
    }
    const reachMost = greatestReach(headRadius, filletRadius, inset);
    if (reach > reachMost + SLACK) return [most('reach', reachMost, 'beyond it the neck closes')];
  }
  return shoulderRefusals(parameters, edgeLength / 2 - inset, inset);
}

/**
 * Where the shoulders are left less than nothing. With f = r_f the joint takes x² = reach · (2 r_h + 2 f −
 * reach) on each side of the middle; a fillet under c/2 is a sharp lip of the socket, which lies where a
 * fillet of c/2 would end, so f is at least c/2.
 */
function shoulderRefusals(
  { headRadius, filletRadius, reach }: RoundParameters,
  half: Millimetres,
  inset: Millimetres,
): Refusal[] {
  const foot = Math.max(filletRadius, inset);
  // x ≤ half solved for r_h + f
  const bothMost = (half ** 2 / reach + reach) / 2;
  if (headRadius + foot <= bothMost + SLACK) return [];
  const because = 'the fillet must end before the corner of the tile';
  const filletMost = bothMost - headRadius;
  if (filletMost >= inset) return [most('filletRadius', filletMost, because)];
  return [most('headRadius', bothMost - inset, because)];
}

/** The reach that leaves the least neck n after clearance: x_f = r_f + (c + n)/2. */
function greatestReach(head: Millimetres, fillet: Millimetres, inset: Millimetres): Millimetres {
  const centre = fillet + inset + LEAST_WOOD / 2;
  return head + fillet + Math.sqrt((head + fillet) ** 2 - centre ** 2);
}

function least(field: string, value: Millimetres, because: string): Refusal {
  return { field, limit: 'least', value, measure: 'length', because };
}

function most(field: string, value: Millimetres, because: string): Refusal {
  return { field, limit: 'most', value, measure: 'length', because };
}
