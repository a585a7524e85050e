import type { Gap } from '../geometry/distance';
import type { Check } from './context';

/** Wood left between two sockets of a tile, and between a socket and the tile's other sides. */
export const web: Check = ({ webs, webMinimum, length }) => {
  const { betweenSockets, besideSockets } = webs;
  const thinBeside = besideSockets !== null && besideSockets.distance < webMinimum;
  const thinnest = thinBeside ? thinner(besideSockets, betweenSockets) : betweenSockets;
  const base = {
    key: 'web',
    station: 'joint',
    title: 'Thinnest web',
    figure: thinnest ? ({ value: thinnest.distance, kind: 'length' } as const) : null,
    limit: { value: webMinimum, kind: 'length' },
    reason: 'A thin web between sockets breaks at the machine or when the joint is driven home.',
  } as const;
  if (!thinnest) {
    const finding = 'No tile has two sockets that could meet.';
    return { ...base, result: 'clear', finding, remedy: '' };
  }
  const between = thinnest === betweenSockets;
  const remedy = 'Shorten the reach, take a smaller head, or a larger tile.';
  if (thinnest.distance <= 0) {
    const finding = between
      ? 'Two sockets of a tile run into each other: the tile would fall apart.'
      : 'A socket runs into another side of its tile: the tile would fall apart.';
    return { ...base, result: 'stop', finding, remedy };
  }
  const finding = `The thinnest wood ${between ? 'between two sockets' : 'beside a socket'} is ${length(thinnest.distance)}`;
  if (thinnest.distance < webMinimum) {
    const short = `${finding}; ${length(webMinimum)} is the least.`;
    return { ...base, result: 'caution', finding: short, remedy };
  }
  return { ...base, result: 'clear', finding: `${finding}.`, remedy: '' };
};

function thinner(a: Gap, b: Gap | null): Gap {
  return b && b.distance <= a.distance ? b : a;
}
