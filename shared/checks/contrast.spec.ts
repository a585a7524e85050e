import { describe, expect, it } from 'vitest';
import type { Layout } from '../layout/schema';
import { contrastOf } from '../wood/contrast';
import { contrastOfLayout } from './contrast';
import { lantern } from './one-check.fixture';

/** The lantern with some woods in turn round the shell. */
function inTurn(woods: readonly number[], colours: Readonly<Record<number, string>> = {}): Layout {
  const layout = lantern();
  return {
    ...layout,
    woods: layout.woods.map((wood, i) => ({ ...wood, colour: colours[i] ?? wood.colour })),
    cells: layout.cells.map((_, at) => woods[at % woods.length] ?? 0),
  };
}

describe('the contrast of woods side by side', () => {
  it('is clear where they can be told apart', () => {
    const result = contrastOfLayout(inTurn([0, 1]));
    expect(result).toMatchObject({ key: 'contrast', result: 'clear', remedy: '' });
    expect(result.figure?.value).toBeCloseTo(contrastOf('#DCC39A', '#5B3D2A'), 9);
    expect(result.finding).toMatch(/^White ash and black walnut are the nearest in look .* ΔE \d/);
  });

  it('is clear in one wood: there is nothing to measure', () => {
    expect(contrastOfLayout(lantern())).toMatchObject({ result: 'clear', figure: null });
  });

  it('is a caution under ΔE 10, and names the woods that blur', () => {
    const nearly = contrastOfLayout(inTurn([0, 3, 0, 1], { 0: '#DCC39A', 3: '#D9BC90' }));
    expect(nearly.result).toBe('caution');
    expect(nearly.finding).toMatch(
      /^White ash and beech are only ΔE \d\.\d apart: the joint line will hardly show\.$/,
    );
    expect(nearly.remedy).not.toBe('');
  });

  it('looks only at woods that lie side by side', () => {
    const near = { 0: '#DCC39A', 3: '#D9BC90' };
    // walnut stands between ash and beech all the way round: a course is 32 tiles, a round is 4
    expect(contrastOfLayout(inTurn([0, 1, 3, 1], near)).result).toBe('clear');
  });

  it('turns at ΔE 10, and what is just under never reads as 10.0', () => {
    const grey = (level: number) => `#${level.toString(16).padStart(2, '0').repeat(3)}`;
    const levels = Array.from({ length: 90 }, (_, i) => 120 + i);
    for (const level of levels) {
      const difference = contrastOf(grey(120), grey(level));
      const result = contrastOfLayout(inTurn([0, 1], { 0: grey(120), 1: grey(level) }));
      expect(result.result).toBe(difference < 10 ? 'caution' : 'clear');
      if (difference < 10) expect(result.finding).not.toMatch(/ΔE 10\.0/);
    }
  });

  it('names three pairs, the nearest first, and counts the rest', () => {
    const alike = { 0: '#DCC39A', 1: '#DDC49B', 2: '#DBC299', 3: '#DAC198' };
    const { finding } = contrastOfLayout(inTurn([0, 1, 2, 3, 0, 2, 1, 3], alike));
    expect(finding).toMatch(/and 3 more pairs under 10: their joint lines will hardly show\.$/);
  });
});
