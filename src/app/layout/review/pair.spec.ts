import type { Version } from '@shared/api/version';
import { describe, expect, it } from 'vitest';
import { pairAtFirst } from './pair';

const version = (number: number, revision: number): Version => ({
  ...{ number, revision, note: '', keptAt: '2027-03-02T10:00:00Z', keptBy: 'Ines Marlow' },
  restoredFrom: null,
  thumbnail: { staves: 1, courses: 1, colours: ['#DCC39A'], cells: 'AA==' },
});
const versions = [version(3, 40), version(2, 21), version(1, 5)];

describe('what is compared at first', () => {
  it('is the draft with the last version when the draft went on', () => {
    const pair = { before: 3, after: 'draft' };
    expect(pairAtFirst(versions, { revision: 41, unsaved: false })).toEqual(pair);
    expect(pairAtFirst(versions, { revision: 40, unsaved: true })).toEqual(pair);
  });

  it('is the last version with the one before when the draft is still it', () => {
    const draft = { revision: 40, unsaved: false };
    expect(pairAtFirst(versions, draft)).toEqual({ before: 2, after: 3 });
  });

  it('is the draft when only one version is kept', () => {
    const draft = { revision: 5, unsaved: false };
    expect(pairAtFirst(versions.slice(2), draft)).toEqual({ before: 1, after: 'draft' });
  });

  it('is nothing before anything is kept', () => {
    expect(pairAtFirst([], { revision: 3, unsaved: false })).toBeNull();
  });
});
