import { describe, expect, it } from 'vitest';
import { CHECK_KEYS, worstOf } from './check';
import { lantern } from './one-check.fixture';
import { runChecks, runShapeChecks } from './run-checks';

describe('all checks', () => {
  it('come in one order, clear for a ring that can be made', () => {
    const results = runChecks(lantern());
    expect(results.map(({ key }) => key)).toEqual(CHECK_KEYS);
    expect(worstOf(results)).toBe('clear');
    expect(results.every(({ remedy, reason }) => remedy === '' && reason !== '')).toBe(true);
  });

  it('of shell and joint do not look at the pattern', () => {
    const layout = lantern();
    const painted = { ...layout, cells: layout.cells.map((_, i) => i % 4) };
    expect(runShapeChecks(painted)).toEqual(runShapeChecks(layout));
    expect(runChecks(painted)).not.toEqual(runChecks(layout));
  });

  it('speak the reader’s unit, or else the layout’s own', () => {
    const inches = { ...lantern(), lengthUnit: 'in' as const };
    expect(runChecks(inches).find(({ key }) => key === 'web')?.finding).toMatch(/0\.499 in/);
    const shown = runChecks(inches, { lengthUnit: 'mm' });
    expect(shown.find(({ key }) => key === 'web')?.finding).toMatch(/12\.68 mm/);
  });
});

it('the worst of some results is the worst one, and of none clear', () => {
  expect(worstOf([{ result: 'clear' }, { result: 'stop' }, { result: 'caution' }])).toBe('stop');
  expect(worstOf([])).toBe('clear');
});
