import type { Check } from './context';

/** Whether the cutter's centre path crosses itself: where it does, the cutter cannot enter a mouth or a gap. */
export const reachIn: Check = ({ fit, joints, layout, length, cutter }) => {
  const { diameter } = layout.cutter;
  const narrowest = joints.reduce((a, b) => (b.profile.neck < a.profile.neck ? b : a));
  const mouth = narrowest.profile.neck + layout.joint.clearance;
  const blocked = fit.crossingAt !== null || mouth < diameter - 1e-6;
  const elsewhere = blocked && mouth >= diameter;
  const entry = elsewhere
    ? `Between two edges of a piece there is less room than a ${cutter(diameter)} cutter needs`
    : `The narrowest socket mouth, on the ${narrowest.name}, is ${length(mouth)} wide; the cutter is ${cutter(diameter)}`;
  return {
    key: 'reach-in',
    result: blocked ? 'stop' : 'clear',
    station: 'joint',
    title: 'Room for the cutter',
    figure: { value: mouth, kind: 'length' },
    limit: { value: diameter, kind: 'length' },
    finding: `${entry}.`,
    reason:
      'The cutter has to travel into every socket and along every gap without touching the far side.',
    remedy: blocked ? 'Widen the neck, or take a smaller cutter.' : '',
  };
};
