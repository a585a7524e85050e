import { describe, expect, it } from 'vitest';
import { found } from './one-check.fixture';

const finished = (finishedHeight: number) => ({ shell: { finishedHeight } });

describe('trimming nine courses of 28 mm (252 mm)', () => {
  it('is clear at the full height, and a stop above it', () => {
    expect(found('trim', finished(252)).result).toBe('clear');
    expect(found('trim', finished(252.01))).toMatchObject({
      result: 'stop',
      finding: '9 courses make 252.00 mm, less than the finished height of 252.01 mm.',
      remedy: 'Add a course or taller tiles, or finish at 252.00 mm or less.',
    });
  });

  it('is a caution where less than the web is left beside the stave joint', () => {
    // the head begins at 14 − 3.66 = 10.34; 7.84 leaves 2.5
    expect(found('trim', finished(252 - 2 * 7.83)).result).toBe('clear');
    expect(found('trim', finished(252 - 2 * 7.85))).toMatchObject({
      result: 'caution',
      finding:
        '9 courses make 252.00 mm; 7.85 mm is trimmed at each end, which leaves only 2.49 mm of wood beside the stave joint.',
    });
  });

  it('is a caution where the line cuts the stave joint', () => {
    expect(found('trim', finished(252 - 2 * 14)).finding).toBe(
      '9 courses make 252.00 mm; 14.00 mm is trimmed at each end, which cuts the stave joint of the end tiles.',
    );
  });

  it('is a caution where little is left under the course joint, and a stop past it', () => {
    // a socket of the course joint reaches down to 28 − 7.66 = 20.34
    expect(found('trim', finished(252 - 2 * 18.5))).toMatchObject({ result: 'caution' });
    expect(found('trim', finished(252 - 2 * 20.34)).result).toBe('caution');
    expect(found('trim', finished(252 - 2 * 20.35))).toMatchObject({
      result: 'stop',
      remedy: 'Take a course less, or finish at 211.32 mm or more.',
    });
  });
});

it('a single course may be trimmed anywhere off its stave joint', () => {
  const single = { shell: { courses: 1, finishedHeight: 20 } };
  expect(found('trim', single).finding).toBe(
    '1 course makes 28.00 mm; 4.00 mm is trimmed at each end.',
  );
});
