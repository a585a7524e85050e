import type { Check } from './context';

/** Least neck as a share of the board: common practice, no source. */
const NECK_SHARE = 0.3;

/** A neck much narrower than the board is thick snaps: across a course joint its grain is short. */
export const neck: Check = ({ joints, layout, length }) => {
  const slimmest = joints.reduce((a, b) => (b.profile.neck < a.profile.neck ? b : a));
  const width = slimmest.profile.neck;
  const least = NECK_SHARE * layout.shell.boardThickness;
  const weak = width < least;
  return {
    key: 'neck',
    result: weak ? 'caution' : 'clear',
    station: 'joint',
    title: 'Neck',
    figure: { value: width, kind: 'length' },
    limit: { value: least, kind: 'length' },
    finding: `The neck of the ${slimmest.name} is ${length(width)} wide; a board of ${length(layout.shell.boardThickness)} asks for ${length(least)}.`,
    reason:
      'Short grain: a neck much slimmer than the board snaps off while the joint is driven home.',
    remedy: weak ? 'Widen the neck, or take a thinner board.' : '',
  };
};
