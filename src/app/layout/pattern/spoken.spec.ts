import { describe, expect, it } from 'vitest';
import { startingLayout } from '@shared/layout/starting-layout';
import { laidWords, tileWords } from './spoken';

describe('what is spoken while walking the tiles', () => {
  const layout = startingLayout('Lantern');
  const cells = layout.cells.slice();
  cells[23] = 1;

  it('names the tile, its wood and its neighbours, round the seam and at the end', () => {
    expect(tileWords({ ...layout, cells }, { stave: 0, course: 0 })).toBe(
      'A 1, hard maple. At the seam. Left black walnut, right hard maple, above hard maple, below the end of the shell.',
    );
  });

  it('says what was laid', () => {
    expect(laidWords({ stave: 11, course: 3 }, 1, 'black walnut')).toBe(
      'D 12 is now black walnut.',
    );
    expect(laidWords({ stave: 11, course: 3 }, 8, 'sapele')).toBe(
      'Laid sapele on 8 tiles from D 12.',
    );
    expect(laidWords({ stave: 11, course: 3 }, 0, 'sapele')).toBe('D 12 is sapele already.');
  });
});
