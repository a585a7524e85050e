import type { Check } from './context';

/** The flutes must reach through the board: above them the shank rubs and burns. */
export const flute: Check = ({ layout, length }) => {
  const { fluteLength } = layout.cutter;
  const { boardThickness } = layout.shell;
  const short = fluteLength < boardThickness;
  return {
    key: 'flute',
    result: short ? 'stop' : 'clear',
    station: 'joint',
    title: 'Flute length',
    figure: { value: fluteLength, kind: 'length' },
    limit: { value: boardThickness, kind: 'length' },
    finding: `The cutter's flutes are ${length(fluteLength)} long; the board is ${length(boardThickness)}.`,
    reason: 'Above its flutes a cutter does not cut: its shank rubs and burns the edge.',
    remedy: short ? 'Take a cutter with longer flutes, or a thinner board.' : '',
  };
};
