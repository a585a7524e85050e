import { describe, expect, it } from 'vitest';
import type { Layout } from '@shared/layout/schema';
import { startingLayout } from '@shared/layout/starting-layout';
import { pieceKinds } from '@shared/pieces/piece-kinds';
import { patternSvg } from './pattern-svg';

const layout = startingLayout('Test & ring');

function drawn(changes: Partial<Layout> = {}): string {
  const changed = { ...layout, ...changes };
  return patternSvg(changed, pieceKinds(changed), 'mm');
}

const count = (text: string, what: RegExp) => text.match(what)?.length ?? 0;

describe('the numbered map', () => {
  it('places every tile and names it, its course and its stave', () => {
    const text = drawn();
    expect(count(text, /<use /g)).toBe(24 * 8);
    for (const name of ['A 1', 'D 12', 'H 24']) expect(text).toContain(`>${name}</text>`);
    expect(count(text, />H<\/text>/g)).toBe(2);
    expect(text).toContain('<title>Test &amp; ring</title>');
  });

  it('defines a tile once for all that show the same', () => {
    const ids = drawn().match(/<g id="[^"]+"/g) ?? [];
    expect(new Set(ids).size).toBe(ids.length);
    expect(ids.length).toBeLessThanOrEqual(12);
  });

  it('marks what lies face down only where pieces are turned over', () => {
    expect(drawn()).toContain('lies face down');
    expect(drawn({ build: { ...layout.build, turnOver: false } })).not.toContain('lies face down');
  });

  it('draws trim lines only where something is cut off', () => {
    expect(count(drawn(), /stroke-dasharray/g)).toBe(3);
    const shell = { ...layout.shell, finishedHeight: 240 };
    expect(count(drawn({ shell }), /stroke-dasharray/g)).toBe(0);
  });

  it('says in the legend only the woods that are laid', () => {
    expect(drawn()).toContain('Hard maple: 192 tiles, kinds 1, 2, 3, 4');
    expect(drawn()).not.toContain('Black walnut');
  });

  it('leaves the names of a very large shell to its edges', () => {
    const shell = { ...layout.shell, staves: 240, courses: 21 };
    const text = drawn({ shell, cells: new Uint8Array(240 * 21) });
    expect(text).not.toContain('>A 1<');
    expect(count(text, />240<\/text>/g)).toBe(2);
  });
});
