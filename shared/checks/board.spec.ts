import { describe, expect, it } from 'vitest';
import { found } from './one-check.fixture';

describe('the board', () => {
  it('is clear at the least thickness, tabs included, and a stop under it', () => {
    const least = found('board', {}).limit?.value ?? NaN;
    expect(found('board', { shell: { boardThickness: least } }).result).toBe('clear');
    expect(found('board', { shell: { boardThickness: least - 0.01 } }).result).toBe('stop');
  });

  it('says how much of it the tabs ask for', () => {
    const thin = found('board', { shell: { boardThickness: 13 } });
    expect(thin.finding).toBe(
      'The board must be at least 13.24 mm; of that, 0.97 mm is for the tabs, which lift off the circle. It is 13.00 mm.',
    );
    expect(thin.remedy).toBe(
      "Take a board of 13.24 mm or more, bore wider, or shorten the stave joint's reach.",
    );
    expect(found('board', { shell: { boardThickness: 13 } }, { lengthUnit: 'in' }).finding).toBe(
      'The board must be at least 0.521 in; of that, 0.038 in is for the tabs, which lift off the circle. It is 0.512 in.',
    );
  });
});

describe('turning the outside', () => {
  const acrossFlats = 28 / Math.tan(Math.PI / 32);

  it('is clear down from the flats less twice the skim, and a stop beyond', () => {
    const most = acrossFlats - 1;
    expect(found('board', { shell: { finishedOuterDiameter: most } }).result).toBe('clear');
    expect(found('board', { shell: { finishedOuterDiameter: most + 0.01 } })).toMatchObject({
      result: 'stop',
      limit: { value: 0.5 },
      finding:
        'The ring is 284.29 mm across the flats; turned to 283.30 mm with 0.50 mm to turn away it would keep flats.',
      remedy: 'Turn to 283.29 mm at most, or take wider tiles or more staves.',
    });
  });

  it('does not advise to turn under the bore', () => {
    const small = found('board', { shell: { tileWidth: 20 } });
    expect(small.remedy).toBe('Take wider tiles or more staves.');
  });
});
