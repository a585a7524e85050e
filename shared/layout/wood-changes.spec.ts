import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { problemsOf } from './consistency';
import { applyPatch, invertPatch } from './patch';
import type { Layout, Wood } from './schema';
import { startingLayout } from './starting-layout';
import { addWood, editWood, hasRoomForWood, removeWood } from './wood-changes';

const sapele = { name: 'Sapele', colour: '#9A4B34', sawn: 'flat' as const };

function layoutWith(woods: number): Layout {
  const start = startingLayout('Test ring');
  const list: Wood[] = Array.from({ length: woods }, (_, i) => ({ ...sapele, key: `wood-${i}` }));
  return { ...start, woods: list, cells: start.cells.map((_, i) => i % woods) };
}

describe('the woods of a layout', () => {
  it('take a new one with a key made of its name', () => {
    const layout = layoutWith(2);
    const once = applyPatch(layout, addWood(layout, { ...sapele, name: 'Érable sycomore!' }));
    const twice = applyPatch(once, addWood(once, { ...sapele, name: 'Erable sycomore' }));
    expect(twice.woods.slice(2).map((wood) => wood.key)).toEqual([
      'erable-sycomore',
      'erable-sycomore-2',
    ]);
    expect(problemsOf(twice)).toEqual([]);
  });

  it('number a key that is taken, and name one that has no letters', () => {
    const layout = layoutWith(1);
    const one = applyPatch(layout, addWood(layout, { ...sapele, name: '樫' }));
    const two = applyPatch(one, addWood(one, { ...sapele, name: '欅' }));
    expect(two.woods.map((wood) => wood.key)).toEqual(['wood-0', 'wood', 'wood-2']);
  });

  it('are full at 24', () => {
    const layout = layoutWith(24);
    expect(hasRoomForWood(layout)).toBe(false);
    expect(addWood(layout, sapele)).toEqual([]);
  });

  it('keep key and tiles when one is called otherwise', () => {
    const layout = layoutWith(2);
    const after = applyPatch(layout, editWood(layout, 1, { ...sapele, name: 'Utile' }));
    expect(after.woods[1]).toEqual({ ...sapele, key: 'wood-1', name: 'Utile' });
    expect(after.cells).toEqual(layout.cells);
    expect(editWood(after, 1, { ...sapele, name: 'Utile' })).toEqual([]);
  });

  it('never lose the last one', () => {
    expect(removeWood(layoutWith(1), 0, 0)).toEqual([]);
    expect(removeWood(layoutWith(3), 1, 1)).toEqual([]);
  });

  it('give the tiles of a removed wood to its heir, the others keep theirs, and undo brings all back', () => {
    const sizes = fc.record({ woods: fc.integer({ min: 2, max: 24 }), a: fc.nat(), b: fc.nat() });
    fc.assert(
      fc.property(sizes, ({ woods, a, b }) => {
        const layout = layoutWith(woods);
        const index = a % woods;
        const heir = (index + 1 + (b % (woods - 1))) % woods;
        const patch = removeWood(layout, index, heir);
        const after = applyPatch(layout, patch);
        const keyOf = (from: Layout, position: number) =>
          from.woods[from.cells[position] ?? -1]?.key;
        layout.cells.forEach((wood, position) => {
          const expected = layout.woods[wood === index ? heir : wood]?.key;
          expect(keyOf(after, position)).toBe(expected);
        });
        expect(applyPatch(after, invertPatch(patch))).toEqual(layout);
      }),
    );
  });
});
