import { describe, expect, it } from 'vitest';
import { edgeWords } from './edge-words';
import { tileEdges } from './tile-edges';

const GRID = { staves: 8, courses: 3 };

describe('the edges of a piece in words', () => {
  it('tells an alternating tile by its tabs', () => {
    expect(edgeWords(tileEdges('alternating', GRID, 1, 1))).toBe('tabs left and right');
    expect(edgeWords(tileEdges('alternating', GRID, 0, 1))).toBe('tabs up and down');
  });

  it('says when an end is flat', () => {
    expect(edgeWords(tileEdges('alternating', GRID, 0, 0))).toBe('tabs left and right, flat end');
    expect(edgeWords(tileEdges('alternating', GRID, 1, 0))).toBe('tab up, flat end');
    expect(edgeWords(tileEdges('alternating', GRID, 1, 2))).toBe('tab down, flat end');
  });

  it('tells a one-way tile by its two tabs', () => {
    expect(edgeWords(tileEdges('one-way', GRID, 3, 1))).toBe('tabs right and up');
    expect(edgeWords(tileEdges('one-way', GRID, 3, 2))).toBe('tab right, flat end');
  });

  it('tells a tile without tabs by its sockets', () => {
    const single = { staves: 8, courses: 1 };
    expect(edgeWords(tileEdges('alternating', single, 1, 0))).toBe(
      'sockets left and right, both ends flat',
    );
  });
});
