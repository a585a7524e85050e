/** Differences of colour against the published pairs, and contrast of the screens against WCAG's formula. */
import { readFileSync } from 'node:fs';
import { colourDifference, contrastOf, labOf } from '@shared/wood/contrast';
import { wcagContrast } from 'culori';
import { describe, expect, it } from 'vitest';

interface Pair {
  readonly pair: number;
  readonly one: readonly [number, number, number];
  readonly other: readonly [number, number, number];
  readonly difference: number;
}

const pairs: Pair[] = readFileSync(new URL('data/ciede2000.csv', import.meta.url), 'utf8')
  .trim()
  .split('\n')
  .slice(1)
  .map((line) => {
    const [pair, l1, a1, b1, l2, a2, b2, difference] = line.split(',').map(Number);
    return {
      pair: pair!,
      one: [l1!, a1!, b1!],
      other: [l2!, a2!, b2!],
      difference: difference!,
    };
  });

const lab = ([l, a, b]: readonly [number, number, number]) => ({ mode: 'lab65', l, a, b }) as const;

describe('CIEDE2000', () => {
  it('has all 34 pairs at hand, pair 14 as printed', () => {
    expect(pairs).toHaveLength(34);
    expect(pairs[13]?.other).toEqual([50, 0.001, -2.49]);
  });

  it.each(pairs)('pair $pair to four decimals, either way round', ({ one, other, difference }) => {
    expect(Math.abs(colourDifference(lab(one), lab(other)) - difference)).toBeLessThan(1e-4);
    expect(Math.abs(colourDifference(lab(other), lab(one)) - difference)).toBeLessThan(1e-4);
  });

  it('works on CIELAB under D65: white has no colour and black no light', () => {
    const { l, a, b } = labOf('#FFFFFF');
    expect([l, a, b].map((value) => Math.round(value * 1e3) / 1e3 + 0)).toEqual([100, 0, 0]);
    expect(contrastOf('#000000', '#FFFFFF')).toBeCloseTo(100, 3);
  });
});

describe('contrast of the screens (WCAG 2.2, 1.4.3 and 1.4.11)', () => {
  const tokens = new Map(
    [
      ...readFileSync(new URL('../../src/styles/_tokens.scss', import.meta.url), 'utf8').matchAll(
        /--([\w-]+): light-dark\((#\w+), (#\w+)\)/g,
      ),
    ].map(([, name, light, dark]) => [name!, { light: light!, dark: dark! }]),
  );

  it.each([
    ['#000000', '#FFFFFF', 21],
    ['#767676', '#FFFFFF', 4.5422],
    ['#777777', '#FFFFFF', 4.4781],
    ['#949494', '#FFFFFF', 3.0335],
  ])('of %s on %s is known', (one, other, ratio) => {
    expect(relativeContrast(one, other)).toBeCloseTo(ratio, 3);
    expect(wcagContrast(one, other)).toBeCloseTo(ratio, 3);
  });

  const words: [string, string][] = [
    ...['ink', 'mute', 'blue', 'teal-ink', 'clear-ink', 'caution-ink', 'stop-ink'].flatMap(
      (word): [string, string][] => [
        [word, 'paper'],
        [word, 'sheet'],
      ],
    ),
    ['ink', 'pale-blue'],
    ['blue', 'pale-blue'],
    ['on-blue', 'blue'],
    ['on-blue', 'blue-hover'],
    ['teal-ink', 'pale-teal'],
  ];
  it.each(words)('of words in %s on %s is 4.5 or more in both themes', (word, ground) => {
    for (const theme of ['light', 'dark'] as const) {
      expect(relativeContrast(colour(word, theme), colour(ground, theme))).toBeGreaterThanOrEqual(
        4.5,
      );
    }
  });

  const shapes = ['line-strong', 'teal', 'clear', 'caution', 'stop'].flatMap(
    (shape): [string, string][] => [
      [shape, 'paper'],
      [shape, 'sheet'],
    ],
  );
  it.each(shapes)('of shapes in %s on %s is 3 or more in both themes', (shape, ground) => {
    for (const theme of ['light', 'dark'] as const) {
      expect(relativeContrast(colour(shape, theme), colour(ground, theme))).toBeGreaterThanOrEqual(
        3,
      );
    }
  });

  function colour(token: string, theme: 'light' | 'dark'): string {
    const found = tokens.get(token);
    if (!found) throw new Error(`there is no token ${token}`);
    return found[theme];
  }
});

/** (L1 + 0.05) / (L2 + 0.05) of relative luminances, as WCAG 2.x writes it. */
function relativeContrast(one: string, other: string): number {
  const [more, less] = [luminance(one), luminance(other)].sort((a, b) => b - a);
  return (more! + 0.05) / (less! + 0.05);
}

function luminance(colour: string): number {
  const [red, green, blue] = [1, 3, 5].map((at) => {
    const value = Number.parseInt(colour.slice(at, at + 2), 16) / 255;
    return value <= 0.04045 ? value / 12.92 : ((value + 0.055) / 1.055) ** 2.4;
  });
  return 0.2126 * red! + 0.7152 * green! + 0.0722 * blue!;
}
