import { describe, expect, it } from 'vitest';
import { startingLayout } from '@shared/layout/starting-layout';
import { toCutSentence } from './to-cut';

describe('how much there is to cut', () => {
  it('counts the starting layout in one wood', () => {
    expect(toCutSentence(startingLayout('Lantern'))).toBe(
      '192 tiles in 4 outlines, 4 piece kinds, with 22 spares',
    );
  });

  it('counts kinds for each wood', () => {
    const layout = startingLayout('Lantern');
    const cells = layout.cells.map((_, i) => i % 2);
    expect(toCutSentence({ ...layout, cells })).toMatch(/^192 tiles in 4 outlines, /);
  });
});
