import { describe, expect, it } from 'vitest';
import { FILTERS, filterNamed, isFound, sorted } from './commission-view';
import { commissionWith } from './commission.fixture';

const titles = (commissions: readonly { title: string }[]) => commissions.map(({ title }) => title);

describe('finding commissions', () => {
  it('every word is looked for in title, client and woods, in any order', () => {
    const lantern = commissionWith();
    expect(isFound(lantern, 'walnut ferry')).toBe(true);
    expect(isFound(lantern, 'HARBOUR')).toBe(true);
    expect(isFound(lantern, 'walnut wenge')).toBe(false);
    expect(isFound(lantern, '')).toBe(true);
  });

  it('an archived commission is only among the archived', () => {
    const put = commissionWith({ stage: 'cutting', archived: true });
    expect(FILTERS.filter((filter) => filter.holds(put)).map(({ key }) => key)).toEqual([
      'archived',
    ]);
  });

  it('one that is with the client is open too', () => {
    const shown = commissionWith({ stage: 'with-client' });
    expect(FILTERS.filter((filter) => filter.holds(shown)).map(({ key }) => key)).toEqual([
      'open',
      'with-client',
    ]);
  });

  it('an unknown filter in the address opens on what is open', () => {
    expect(filterNamed('nonsense').key).toBe('open');
  });
});

describe('sorting commissions', () => {
  const late = commissionWith({ title: 'Late', due: '2027-05-01' });
  const soon = commissionWith({ title: 'Soon', due: '2027-04-01' });
  const open = commissionWith({ title: 'Open end', due: null });

  it('what has no due date comes last both ways', () => {
    const all = [open, late, soon];
    expect(titles(sorted(all, { key: 'due', direction: 'ascending' }))).toEqual([
      'Soon',
      'Late',
      'Open end',
    ]);
    expect(titles(sorted(all, { key: 'due', direction: 'descending' }))).toEqual([
      'Late',
      'Soon',
      'Open end',
    ]);
  });

  it('where it stands follows the order of the work', () => {
    const cutting = commissionWith({ title: 'Cutting', stage: 'cutting' });
    const design = commissionWith({ title: 'Design', stage: 'design' });
    const approved = commissionWith({ title: 'Approved', stage: 'approved' });
    const order = sorted([cutting, design, approved], { key: 'stage', direction: 'ascending' });
    expect(titles(order)).toEqual(['Design', 'Approved', 'Cutting']);
  });
});
