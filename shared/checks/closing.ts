import { closingOf, type StaveRun } from '../shell/closing';
import type { Check } from './context';

/** Whether the ring can be closed: the play its two last joints need against the clearance they have. */
export const closing: Check = ({ layout, length }) => {
  const { play, parts } = closingOf(layout.shell);
  const { clearance } = layout.joint;
  const stuck = play > clearance + 1e-9;
  const [first, second] = parts.map(size);
  const built =
    first === second
      ? `The ring closes as two halves of ${first} staves`
      : `The ring closes as ${first} staves against ${second}`;
  return {
    key: 'closing',
    result: stuck ? 'stop' : 'clear',
    station: 'shell',
    title: 'Closing the ring',
    figure: { value: play, kind: 'length' },
    limit: { value: clearance, kind: 'length' },
    finding:
      play < 1e-9
        ? `${built}, with no play needed.`
        : `${built}, which needs ${length(play)} of play at the last two joints; the clearance is ${length(clearance)}.`,
    reason:
      'A joined stave slides on along its joint, so two joints close at once only when they lie opposite each other.',
    remedy: stuck ? 'Take an even number of staves: two equal halves close without play.' : '',
  };
};

function size({ from, to }: StaveRun): number {
  return to - from + 1;
}
