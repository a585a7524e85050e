import type { EdgeKind, Side, TileEdges } from './tile-edges';

const DIRECTIONS: readonly (readonly [Side, string])[] = [
  ['left', 'left'],
  ['right', 'right'],
  ['top', 'up'],
  ['bottom', 'down'],
];

/**
 * A piece's edges in a few words: "tabs left and right", "tab up, flat end". A piece without tabs is told
 * by its sockets. Which end is flat is left to the drawing, since half a turn brings it to the other end.
 */
export function edgeWords(edges: TileEdges): string {
  const tabs = sidesWith(edges, 'tab');
  const joints = tabs.length > 0 ? named('tab', tabs) : named('socket', sidesWith(edges, 'socket'));
  const ends = sidesWith(edges, 'flat').length;
  const flat = ends === 0 ? '' : ends === 1 ? ', flat end' : ', both ends flat';
  return joints + flat;
}

function sidesWith(edges: TileEdges, kind: EdgeKind): string[] {
  return DIRECTIONS.flatMap(([side, word]) => (edges[side] === kind ? [word] : []));
}

function named(noun: string, directions: readonly string[]): string {
  return `${noun}${directions.length === 1 ? '' : 's'} ${directions.join(' and ')}`;
}
