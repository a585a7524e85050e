import { runChecks } from '@shared/checks/run-checks';
import { smallLayout } from '@shared/layout/small-layout.fixture';
import { describe, expect, it } from 'vitest';
import { worstFirst } from './worst-first';

describe('checks worst first', () => {
  const layout = smallLayout();
  const checks = runChecks({ ...layout, cutter: { diameter: 6, fluteLength: 10 } });

  it('puts every stop before every caution, and loses none', () => {
    const results = worstFirst(checks).map((check) => check.result);
    const order = { stop: 0, caution: 1, clear: 2 };
    expect(results).toHaveLength(checks.length);
    expect(results[0]).toBe('stop');
    expect(results).toEqual([...results].sort((a, b) => order[a] - order[b]));
  });

  it('leaves equals in the order of the checks', () => {
    const keys = checks.filter(({ result }) => result === 'stop').map(({ key }) => key);
    const sorted = worstFirst(checks).filter(({ result }) => result === 'stop');
    expect(sorted.map(({ key }) => key)).toEqual(keys);
  });
});
