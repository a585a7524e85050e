import { describe, expect, it } from 'vitest';
import { smallLayout } from '../layout/small-layout.fixture';
import type { Layout } from '../layout/schema';
import { pieceKinds } from './piece-kinds';

function layoutOf(
  size: { staves: number; courses: number },
  changes: { scheme?: Layout['joint']['scheme']; turnOver?: boolean } = {},
): Layout {
  const layout = smallLayout();
  return {
    ...layout,
    shell: { ...layout.shell, ...size },
    joint: { ...layout.joint, scheme: changes.scheme ?? 'alternating' },
    build: { ...layout.build, turnOver: changes.turnOver ?? true },
    cells: new Uint8Array(size.staves * size.courses),
  };
}

const counts = (layout: Layout) => pieceKinds(layout).map(({ count }) => count);

describe('one wood', () => {
  it('alternating tabs make four outlines whatever the size: two ends, two middles', () => {
    for (const turnOver of [true, false]) {
      expect(counts(layoutOf({ staves: 8, courses: 5 }, { turnOver }))).toEqual([8, 8, 12, 12]);
      expect(counts(layoutOf({ staves: 40, courses: 8 }, { turnOver }))).toHaveLength(4);
    }
  });

  it('two courses of alternating tabs have ends only, one course only flat ones', () => {
    expect(counts(layoutOf({ staves: 8, courses: 2 }))).toEqual([8, 8]);
    expect(counts(layoutOf({ staves: 8, courses: 1 }))).toEqual([4, 4]);
  });

  it('one-way tabs make three outlines: a bottom, a middle and a top', () => {
    const oneWay = { scheme: 'one-way', turnOver: false } as const;
    expect(counts(layoutOf({ staves: 9, courses: 5 }, oneWay))).toEqual([9, 27, 9]);
  });

  it('one-way middles that lie face down are cut as their mirror image, a kind of their own', () => {
    const kinds = pieceKinds(layoutOf({ staves: 9, courses: 5 }, { scheme: 'one-way' }));
    expect(kinds.map(({ mirrored, count }) => [mirrored, count])).toEqual([
      [false, 9],
      [true, 18],
      [false, 9],
      [false, 9],
    ]);
    expect(kinds[1]?.edges).toEqual({ left: 'tab', right: 'socket', bottom: 'socket', top: 'tab' });
    expect(kinds[1]?.faceDown).toEqual(kinds[1]?.positions);
  });
});

describe('which tiles a kind fills', () => {
  it('the last course is the first after half a turn', () => {
    const [ends] = pieceKinds(layoutOf({ staves: 8, courses: 2 }));
    expect(ends?.positions).toHaveLength(8);
    expect(ends?.halfTurned).toEqual(ends?.positions.filter((position) => position >= 8));
    expect(ends?.faceDown).toEqual(ends?.halfTurned);
  });

  it('every tile has exactly one kind, of its own wood', () => {
    const layout = layoutOf({ staves: 8, courses: 5 });
    layout.cells.forEach((_, i) => (layout.cells[i] = (i * 7) % 3));
    const kinds = pieceKinds(layout);
    const filled = kinds.flatMap(({ positions }) => positions).sort((a, b) => a - b);
    expect(filled).toEqual([...layout.cells.keys()]);
    for (const { wood, positions, number } of kinds) {
      expect(positions.every((position) => layout.cells[position] === wood)).toBe(true);
      expect(kinds[number - 1]?.wood).toBe(wood);
    }
    expect(kinds.map(({ wood }) => wood)).toEqual(kinds.map(({ wood }) => wood).sort());
  });
});
