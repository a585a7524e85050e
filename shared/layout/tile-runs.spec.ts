import { describe, expect, it } from 'vitest';
import { runWords, tileRuns } from './tile-runs';

const GRID = { staves: 32, courses: 2 };

function wordsOf(positions: readonly number[]): string[] {
  return tileRuns(GRID, positions).map(({ course, runs }) => `${course}: ${runWords(runs)}`);
}

describe('tiles as runs', () => {
  it('says a checker as every other tile', () => {
    const even = Array.from({ length: 16 }, (_, i) => 2 * i);
    expect(wordsOf(even)).toEqual(['A: every other from 1 to 31']);
  });

  it('gathers neighbours and lists what stands alone', () => {
    expect(wordsOf([0, 1, 2, 3, 7, 9])).toEqual(['A: 1 to 4, 8, 10']);
  });

  it('starts anew in each course', () => {
    expect(wordsOf([30, 31, 32, 33])).toEqual(['A: 31, 32', 'B: 1, 2']);
  });

  it('names every tile exactly once', () => {
    const positions = [0, 2, 3, 4, 6, 8, 10, 11, 20, 40, 41];
    const named = tileRuns(GRID, positions).flatMap(({ course, runs }) =>
      runs.flatMap(({ from, to, step }) =>
        Array.from({ length: (to - from) / step + 1 }, (_, i) => {
          return (course === 'A' ? 0 : 32) + from - 1 + i * step;
        }),
      ),
    );
    expect(named).toEqual(positions);
  });

  it('has nothing to say about no tiles', () => {
    expect(wordsOf([])).toEqual([]);
  });
});
