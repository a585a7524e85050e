import type { Check } from './context';

/** What locks a joint is how far the head is wider than the neck; within the clearance it slides apart. */
export const undercut: Check = ({ joints, layout, length }) => {
  const weakest = joints.reduce((a, b) => (b.profile.undercut < a.profile.undercut ? b : a));
  const hold = weakest.profile.undercut;
  const { clearance } = layout.joint;
  const loose = hold <= clearance;
  const wave = hold === 0;
  return {
    key: 'undercut',
    result: loose ? 'caution' : 'clear',
    station: 'joint',
    title: 'Undercut',
    figure: { value: hold, kind: 'length' },
    limit: { value: clearance, kind: 'length' },
    finding: wave
      ? `The ${weakest.name} is a wave without undercut: it does not lock.`
      : `The ${weakest.name} holds by ${length(hold)} of undercut on each side; the clearance is ${length(clearance)}.`,
    reason: 'A head no wider than its neck and the clearance slips out until the glue has set.',
    remedy: loose ? 'Raise the reach or the head, or clamp both ways while the glue sets.' : '',
  };
};
