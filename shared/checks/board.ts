import type { CheckResult } from './check';
import type { Check, CheckContext } from './context';

/** Whether the board leaves wood to turn everywhere, outside and, behind the tabs, inside. */
export const board: Check = (context) => {
  const { layout, ring, length } = context;
  const { boardThickness, skimAllowance } = layout.shell;
  if (ring.turnedAway < skimAllowance - 1e-9) return keepsFlats(context);
  const base = {
    ...BASE,
    figure: { value: boardThickness, kind: 'length' },
    limit: { value: ring.boardLeast, kind: 'length' },
  } as const;
  const forTabs = ring.boardLeast - ring.boardLeastWithoutTabs;
  const need = `The board must be at least ${length(ring.boardLeast)}; of that, ${length(forTabs)} is for the tabs, which lift off the circle`;
  if (boardThickness < ring.boardLeast - 1e-9) {
    return {
      ...base,
      result: 'stop',
      finding: `${need}. It is ${length(boardThickness)}.`,
      remedy: `Take a board of ${length(ring.boardLeast)} or more, bore wider, or shorten the stave joint's reach.`,
    };
  }
  return { ...base, result: 'clear', finding: `${need}.`, remedy: '' };
};

const BASE = {
  key: 'board',
  station: 'shell',
  title: 'Board thickness',
  reason:
    'Turning must take something off everywhere; where it does not, flats and hollows stay behind the tabs.',
} as const;

/** The outside is turned to a diameter the flat staves do not reach everywhere. */
function keepsFlats({ layout, ring, length }: CheckContext): CheckResult {
  const { skimAllowance, finishedOuterDiameter, finishedInnerDiameter } = layout.shell;
  const most = ring.acrossFlats - 2 * skimAllowance;
  return {
    ...BASE,
    figure: { value: ring.turnedAway, kind: 'length' },
    limit: { value: skimAllowance, kind: 'length' },
    result: 'stop',
    finding: `The ring is ${length(ring.acrossFlats)} across the flats; turned to ${length(finishedOuterDiameter)} with ${length(skimAllowance)} to turn away it would keep flats.`,
    remedy:
      most > finishedInnerDiameter
        ? `Turn to ${length(most)} at most, or take wider tiles or more staves.`
        : 'Take wider tiles or more staves.',
  };
}
