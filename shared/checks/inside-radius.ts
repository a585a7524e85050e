import type { JointParameters } from '../joint/parameters';
import type { Millimetres } from '../units/length';
import type { CheckResult } from './check';
import type { Check, CheckContext } from './context';

/**
 * The tightest inside arc of all pieces, after clearance, against the cutter's radius: a cutter cannot make
 * an inside arc tighter than itself. Caution within the finishing margin, where the cutter dwells.
 */
export const insideRadius: Check = (context) => {
  const { fit, layout } = context;
  const needed = layout.cutter.diameter / 2;
  const radius = fit.tightest?.radius ?? null;
  const base = {
    key: 'inside-radius',
    station: 'joint',
    title: 'Tightest inside radius',
    figure: radius === null ? null : { value: radius, kind: 'length' },
    limit: { value: needed, kind: 'length' },
    reason:
      'A round cutter leaves its own radius in every inside corner; in a tighter one it leaves wood, and the joint will not go together.',
  } as const satisfies Partial<CheckResult>;
  return radius === null
    ? { ...base, result: 'clear', finding: 'No piece has an inside corner.', remedy: '' }
    : { ...base, ...held(context, radius, needed) };
};

/** The radius held against the cutter's. */
function held(
  context: CheckContext,
  radius: Millimetres,
  needed: Millimetres,
): Pick<CheckResult, 'result' | 'finding' | 'remedy'> {
  const { fit, layout, finishingMargin, length, cutter, offeredCutter } = context;
  const place = placeName(context);
  // 1.586 and 1.5875 mm are both "1.59 mm": a third decimal tells them apart
  const figure = radius !== needed && length(radius) === length(needed) ? cutter : length;
  const size = `The ${place.part} of the ${place.joint} is cut at ${figure(radius)}`;
  const need = `a ${cutter(layout.cutter.diameter)} cutter needs ${figure(needed)}`;
  if (radius < needed - 1e-6) {
    const smaller =
      fit.largestCutter >= 0.5 ? ` or take a ${offeredCutter(fit.largestCutter)} cutter` : '';
    const remedy = `Widen the ${place.part}${smaller}.`;
    return { result: 'stop', finding: `${size}; ${need}.`, remedy };
  }
  const wished = needed * (1 + finishingMargin);
  if (radius < wished) {
    const finding = `${size}; ${need} and turns more freely from ${length(wished)}.`;
    const remedy = `Widen the ${place.part} a little, or take a smaller cutter.`;
    return { result: 'caution', finding, remedy };
  }
  return { result: 'clear', finding: `${size}; ${need}.`, remedy: '' };
}

interface PlaceName {
  readonly part: string;
  readonly joint: string;
}

function placeName({ fit, layout }: CheckContext): PlaceName {
  const { place } = fit;
  if (!place) return { part: 'inside corner', joint: 'tile' };
  const along = place.side === 'left' || place.side === 'right';
  const parameters = along ? layout.joint.staveJoint : layout.joint.courseJoint;
  return { part: partName(parameters, place.edge), joint: along ? 'stave joint' : 'course joint' };
}

function partName(parameters: JointParameters, edge: 'tab' | 'socket'): string {
  if (parameters.profile === 'round') return edge === 'tab' ? 'neck fillet' : 'head';
  return edge === 'tab' ? 'root fillet' : 'tip';
}
