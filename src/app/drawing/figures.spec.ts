import { describe, expect, it } from 'vitest';
import { figuresIn } from './figures';

const figures = (sentence: string) =>
  figuresIn(sentence)
    .filter((part) => part.kind === 'figure')
    .map((part) => part.text);

describe('figures in a sentence', () => {
  it('a figure keeps its unit', () => {
    expect(figures('The neck fillet is 1.40 mm; a 3.175 mm cutter needs 1.59 mm.')).toEqual([
      '1.40 mm',
      '3.175 mm',
      '1.59 mm',
    ]);
  });

  it('angles, shares and counts are figures', () => {
    expect(figures('Bevelled 5.625°, 8 % left, in halves of 16 staves, ΔE 7.4 apart')).toEqual([
      '5.625°',
      '8 %',
      '16 staves',
      'ΔE 7.4',
    ]);
  });

  it('a full stop after a figure stays outside', () => {
    expect(figures('It needs at least 13.24.')).toEqual(['13.24']);
  });

  it('the digits of a name are not a figure', () => {
    expect(figures('R2000 and R12 are formats')).toEqual([]);
  });

  it('the parts joined are the sentence', () => {
    const sentence = '288 tiles in 10 outlines, with 29 spare';
    expect(
      figuresIn(sentence)
        .map((part) => part.text)
        .join(''),
    ).toBe(sentence);
  });
});
