import { FormControl } from '@angular/forms';
import { describe, expect, it } from 'vitest';
import { figureWithin } from './figure-within';

const sentenceAbout = (text: string, options: { readonly whole: boolean }): unknown =>
  new FormControl(text, figureWithin({ least: 0, most: 100 }, options)).getError('figure');

describe('a figure within bounds', () => {
  it('takes both bounds and what lies between', () => {
    for (const text of ['0', '12.5', ' 100 ']) {
      expect(sentenceAbout(text, { whole: false })).toBeNull();
    }
  });

  it('says the bounds about anything else', () => {
    for (const text of ['', '-1', '101', 'ten', 'NaN']) {
      expect(sentenceAbout(text, { whole: false })).toBe('Must be a number from 0 to 100.');
    }
  });

  it('takes no fractions where only whole numbers count', () => {
    expect(sentenceAbout('2', { whole: true })).toBeNull();
    expect(sentenceAbout('2.5', { whole: true })).toBe('Must be a whole number from 0 to 100.');
  });
});
