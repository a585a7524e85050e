import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { woodsSideBySide } from './neighbours';

describe('woods side by side', () => {
  it('are found across stave joints, course joints and the seam, each pair once', () => {
    const grid = { staves: 6, courses: 2 };
    const cells = Uint8Array.of(0, 0, 1, 0, 0, 2, 0, 0, 0, 0, 3, 0);
    expect(woodsSideBySide(grid, cells)).toEqual([
      { wood: 0, other: 1 },
      { wood: 0, other: 2 },
      { wood: 0, other: 3 },
    ]);
  });

  it('are none where all is one wood, and never a wood with itself', () => {
    expect(woodsSideBySide({ staves: 6, courses: 2 }, new Uint8Array(12))).toEqual([]);
  });

  it('are not found across the two ends of the shell', () => {
    const cells = Uint8Array.of(
      ...[1, 1, 1, 1, 1, 1],
      ...[0, 0, 0, 0, 0, 0],
      ...[2, 2, 2, 2, 2, 2],
    );
    expect(woodsSideBySide({ staves: 6, courses: 3 }, cells)).not.toContainEqual({
      wood: 1,
      other: 2,
    });
  });

  it('are the same wherever the seam lies', () => {
    const tiles = fc.array(fc.nat(23), { minLength: 18, maxLength: 18 });
    fc.assert(
      fc.property(tiles, fc.nat(5), (woods, by) => {
        const grid = { staves: 6, courses: 3 };
        const cells = Uint8Array.from(woods);
        const turned = cells.map((_, at) => cells[at - (at % 6) + ((at + by) % 6)] ?? 0);
        expect(woodsSideBySide(grid, turned)).toEqual(woodsSideBySide(grid, cells));
      }),
      { seed: 280_714 },
    );
  });
});
