import { describe, expect, it } from 'vitest';
import { fileSize } from './file-size';

describe('a file size', () => {
  it('is told in the unit that reads best', () => {
    expect(fileSize(812)).toBe('812 bytes');
    expect(fileSize(24_300)).toBe('24 kB');
    expect(fileSize(1_280_000)).toBe('1.3 MB');
  });

  it('never says 1000 kB', () => {
    expect(fileSize(999_499)).toBe('999 kB');
    expect(fileSize(999_500)).toBe('1.0 MB');
  });
});
