import type { Mark, PixelPoint } from './picture-model';

const TICK = 7;

/** A level dimension line with a tick at each end and its figure above or in the middle of it. */
export function levelDimension(
  from: PixelPoint,
  toX: number,
  text: string,
  place: 'above' | 'in-line' = 'above',
): Mark[] {
  const to = { x: toX, y: from.y };
  const middle = (from.x + toX) / 2;
  const words: Mark = {
    kind: 'text',
    at: { x: middle, y: place === 'above' ? from.y - 10 : from.y },
    text,
    anchor: 'middle',
    look: 'figure',
    ...(place === 'in-line' ? { ground: 'paper' as const } : {}),
  };
  return [{ kind: 'line', from, to, look: 'thin' }, ...ticks(from, to, 'upright'), words];
}

/** An upright dimension line with a tick at each end and its figure beside it, reading upwards. */
export function uprightDimension(
  from: PixelPoint,
  toY: number,
  text: string,
  place: 'left' | 'right' = 'right',
): Mark[] {
  const to = { x: from.x, y: toY };
  const words: Mark = {
    kind: 'text',
    at: { x: from.x + (place === 'right' ? 15 : -11), y: (from.y + toY) / 2 },
    text,
    anchor: 'middle',
    look: 'figure',
    turn: 'upright',
  };
  return [{ kind: 'line', from, to, look: 'thin' }, ...ticks(from, to, 'level'), words];
}

function ticks(from: PixelPoint, to: PixelPoint, way: 'upright' | 'level'): Mark[] {
  const [dx, dy] = way === 'upright' ? [0, TICK] : [TICK, 0];
  return [from, to].map((end) => ({
    kind: 'line',
    from: { x: end.x - dx, y: end.y - dy },
    to: { x: end.x + dx, y: end.y + dy },
    look: 'thin',
  }));
}
