import { expect, it } from 'vitest';
import { shareWords } from './share-words';

it('says a share in whole percent, and never calls some tiles none or all', () => {
  expect(shareWords(144, 288)).toBe('50 %');
  expect(shareWords(0, 288)).toBe('0 %');
  expect(shareWords(1, 288)).toBe('under 1 %');
  expect(shareWords(287, 288)).toBe('over 99 %');
  expect(shareWords(288, 288)).toBe('100 %');
});
