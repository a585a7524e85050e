import type { Check } from './context';

/** Whether the board leaves wood to turn everywhere, outside and, behind the tabs, inside. */
export const board: Check = ({ layout, ring, length }) => {
  const { boardThickness, skimAllowance, finishedOuterDiameter } = layout.shell;
  const base = {
    key: 'board',
    station: 'shell',
    title: 'Board thickness',
    figure: { value: boardThickness, kind: 'length' },
    limit: { value: ring.boardLeast, kind: 'length' },
    reason:
      'Turning must take something off everywhere; where it does not, flats and hollows stay behind the tabs.',
  } as const;
  if (ring.turnedAway < skimAllowance - 1e-9) {
    const most = ring.acrossFlats - 2 * skimAllowance;
    return {
      ...base,
      result: 'stop',
      finding: `The ring is ${length(ring.acrossFlats)} across the flats; turned to ${length(finishedOuterDiameter)} with ${length(skimAllowance)} to turn away it would keep flats.`,
      remedy: `Turn to ${length(most)} at most, or take wider tiles or more staves.`,
    };
  }
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
