import { describe, expect, it } from 'vitest';
import { figuresOf } from './wood-figure';

const woods = (...keys: string[]) => keys.map((key) => ({ key }));

describe('the figure of a wood', () => {
  it('is another one for each of 24 woods', () => {
    const keys = Array.from({ length: 24 }, (_, i) => `wood-${i}`);
    const figures = figuresOf(woods(...keys)).map(({ mark, density }) => `${mark} ${density}`);
    expect(new Set(figures).size).toBe(24);
  });

  it('stays when woods are added after it', () => {
    const few = figuresOf(woods('ash', 'walnut'));
    expect(figuresOf(woods('ash', 'walnut', 'sapele', 'beech')).slice(0, 2)).toEqual(few);
  });
});
