import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  copiedTiles,
  copyPatch,
  layCopiedPatch,
  printCopiedPatch,
  readCopiedPatch,
} from './copied-patch';
import { boxBetween } from './extent';
import { applyPatch } from './patch';
import { ONCE } from './repeats';
import { smallLayout } from './small-layout.fixture';

const layout = { ...smallLayout(), cells: Uint8Array.from({ length: 24 }, (_, i) => i % 3) };
const grid = { staves: 8, courses: 3, cells: layout.cells };

function copied(from: { stave: number; course: number }, to: { stave: number; course: number }) {
  const box = boxBetween(grid, from, to);
  if (!box) throw new Error('The corners lie beside the shell');
  return copyPatch(grid, layout.woods, box);
}

describe('a patch copied', () => {
  it('holds its tiles, across the seam, and only the woods among them', () => {
    const patch = copied({ stave: 7, course: 0 }, { stave: 8, course: 1 });
    expect(patch.staves * patch.courses).toBe(4);
    expect(patch.woods.map(({ key }) => key)).toEqual(['ash', 'walnut', 'sapele']);
    expect([...patch.cells]).toEqual([1, 0, 0, 2]);
  });

  it('comes back from its text', () => {
    const patch = copied({ stave: 2, course: 0 }, { stave: 4, course: 2 });
    expect(readCopiedPatch(printCopiedPatch(patch))).toEqual(patch);
  });

  it('is not read from anything else', () => {
    const text = printCopiedPatch(copied({ stave: 0, course: 0 }, { stave: 1, course: 1 }));
    const broken = [
      'a shopping list',
      '{}',
      text.slice(0, -1),
      text.replace('"staves":2', '"staves":3'),
      text.replace('"formatVersion":1', '"formatVersion":2'),
      text.replace(/"cells":".{4}/, '"cells":"////'),
      text.replace('"key":"walnut"', '"key":"ash"'),
      text.replace('"format"', '"other":1,"format"'),
      ' '.repeat(70_000),
    ];
    expect(broken.map(readCopiedPatch)).toEqual(broken.map(() => null));
  });
});

describe('a copied patch laid again', () => {
  const anyPatch = fc
    .record({
      corner: fc.record({ stave: fc.nat(7), course: fc.nat(2) }),
      to: fc.record({ stave: fc.nat(14), course: fc.nat(2) }),
    })
    .map(({ corner, to }) => ({
      box: boxBetween(grid, corner, to) ?? { ...corner, staves: 1, courses: 1 },
    }));

  it('changes nothing where it was copied, and turned by staves it is the same patch', () => {
    fc.assert(
      fc.property(anyPatch, fc.nat(7), ({ box }, by) => {
        const patch = copyPatch(grid, layout.woods, box);
        const woods = patch.woods.map(({ key }) => layout.woods.findIndex((w) => w.key === key));
        expect(layCopiedPatch(grid, patch, { at: box, woods })).toBeNull();
        const at = { stave: box.stave + by, course: box.course };
        const change = layCopiedPatch(grid, patch, { at, woods });
        const after = applyPatch(layout, change ? [change] : []);
        const there = copyPatch({ ...grid, cells: after.cells }, layout.woods, {
          ...box,
          stave: at.stave,
        });
        expect(there).toEqual(patch);
      }),
    );
  });

  it('is turned over where it is mirrored, and cut off at the top', () => {
    const patch = copyPatch(
      {
        staves: 8,
        courses: 3,
        cells: Uint8Array.from({ length: 24 }, (_, i) => (i === 1 ? 1 : 0)),
      },
      layout.woods,
      { stave: 0, course: 0, staves: 2, courses: 2 },
    );
    const tiles = copiedTiles(grid, patch, {
      at: { stave: 0, course: 2 },
      woods: [0, 3],
      repeats: { ...ONCE, mirror: 'at-seam' },
    });
    expect([...tiles].sort(([a], [b]) => a - b)).toEqual([
      [16, 0],
      [17, 3],
      [22, 3],
      [23, 0],
    ]);
  });
});
