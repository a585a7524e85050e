/** Which commissions are shown, and in which order: pure, so that the page only draws. */
import { STAGES, type Commission } from '@shared/api/commission';

export interface Filter {
  readonly key: string;
  readonly label: string;
  readonly holds: (commission: Commission) => boolean;
}

const OPEN: Filter = {
  key: 'open',
  label: 'Open',
  holds: ({ archived, stage }) => !archived && stage !== 'delivered',
};

/** The chips above the table, in their order; the first one is where the page opens. */
export const FILTERS: readonly [Filter, ...Filter[]] = [
  OPEN,
  {
    key: 'with-client',
    label: 'With the client',
    holds: ({ archived, stage }) => !archived && stage === 'with-client',
  },
  {
    key: 'cutting',
    label: 'Cutting',
    holds: ({ archived, stage }) => !archived && stage === 'cutting',
  },
  {
    key: 'delivered',
    label: 'Delivered',
    holds: ({ archived, stage }) => !archived && stage === 'delivered',
  },
  { key: 'archived', label: 'Archived', holds: ({ archived }) => archived },
];

/** The filter with this key; the first one for a key that is not known. */
export function filterNamed(key: string | null): Filter {
  return FILTERS.find((filter) => filter.key === key) ?? OPEN;
}

export type SortKey = 'due' | 'title' | 'client' | 'stage' | 'version';
export type SortDirection = 'ascending' | 'descending';

export interface Sort {
  readonly key: SortKey;
  readonly direction: SortDirection;
}

/** The columns that can be sorted by, and what they are called in "sorted by …". */
export const SORT_WORDS: Record<SortKey, string> = {
  due: 'due date',
  title: 'title',
  client: 'client',
  stage: 'where it stands',
  version: 'last version',
};

/** True when every word of the search is in the title, the client or a wood's name. */
export function isFound(commission: Commission, search: string): boolean {
  const { title, client, woods } = commission;
  const text = [title, client ?? '', ...woods].join('\n').toLocaleLowerCase();
  return search
    .toLocaleLowerCase()
    .split(/\s+/)
    .every((word) => text.includes(word));
}

/** A sorted copy. What has no date, client or version comes last in both directions. */
export function sorted(commissions: readonly Commission[], sort: Sort): Commission[] {
  const hand = sort.direction === 'ascending' ? 1 : -1;
  return [...commissions].sort((a, b) => {
    const first = sortValue(a, sort.key);
    const second = sortValue(b, sort.key);
    if (first === null || second === null) {
      return Number(first === null) - Number(second === null) || byTitle(a, b);
    }
    return hand * compare(first, second) || byTitle(a, b);
  });
}

function sortValue(commission: Commission, key: SortKey): string | number | null {
  switch (key) {
    case 'due':
      return commission.due;
    case 'title':
      return commission.title;
    case 'client':
      return commission.client;
    case 'stage':
      return STAGES.indexOf(commission.stage);
    case 'version':
      return commission.lastVersion?.keptAt ?? null;
  }
}

function compare(a: string | number, b: string | number): number {
  if (typeof a === 'number' && typeof b === 'number') return a - b;
  return String(a).localeCompare(String(b), undefined, { numeric: true });
}

function byTitle(a: Commission, b: Commission): number {
  return a.title.localeCompare(b.title, undefined, { numeric: true });
}
