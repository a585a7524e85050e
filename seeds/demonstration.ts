/** The demonstration: two workshops, six people, five commissions. All of it is invented. */
import type { Stage } from '@shared/api/commission';
import type { Role } from '@shared/api/session';

/** Everybody's password. The server's page of sign-in does not show it; the README does. */
export const DEMONSTRATION_PASSWORD = 'ring-of-staves';

export interface SeedPerson {
  readonly name: string;
  readonly email: string;
  readonly workshop: string;
  readonly roles: Role[];
}

const QUARRY_LANE = 'Quarry Lane Shells';
const SALTMARSH = 'Saltmarsh Turnery';

export const WORKSHOPS = [QUARRY_LANE, SALTMARSH] as const;

export const PEOPLE: readonly SeedPerson[] = [
  {
    name: 'Runa Halvorsen',
    email: 'runa@quarrylane.example',
    workshop: QUARRY_LANE,
    roles: ['owner'],
  },
  {
    name: 'Ines Marlow',
    email: 'ines@quarrylane.example',
    workshop: QUARRY_LANE,
    roles: ['designer', 'maker'],
  },
  {
    name: 'Bela Novak',
    email: 'bela@quarrylane.example',
    workshop: QUARRY_LANE,
    roles: ['designer'],
  },
  {
    name: 'Tomas Okoye',
    email: 'tomas@quarrylane.example',
    workshop: QUARRY_LANE,
    roles: ['maker'],
  },
  {
    name: 'Harriet Vale',
    email: 'harriet@harbourtrust.example',
    workshop: QUARRY_LANE,
    roles: ['client'],
  },
  {
    name: 'Jonah Pike',
    email: 'jonah@saltmarsh.example',
    workshop: SALTMARSH,
    roles: ['owner'],
  },
];

/** A state of a layout: its file in `layouts/`, who made it, how long ago, and the note if it was kept. */
export interface SeedState {
  readonly file: string;
  readonly by: string;
  readonly daysAgo: number;
  /** Kept as a version with this note; left out for a draft that went on. */
  readonly note?: string;
}

export interface SeedCommission {
  readonly title: string;
  readonly workshop: string;
  readonly client: string | null;
  readonly due: string | null;
  readonly stage: Stage;
  readonly states: readonly SeedState[];
}

export const COMMISSIONS: readonly SeedCommission[] = [
  {
    title: 'Ferry-hall lantern',
    workshop: QUARRY_LANE,
    client: 'Harbour Trust',
    due: '2027-03-19',
    stage: 'with-client',
    states: [
      {
        file: 'ferry-hall-lantern-1',
        by: 'bela@quarrylane.example',
        daysAgo: 21,
        note: 'Four diamonds in walnut, one towards each door of the hall.',
      },
      {
        file: 'ferry-hall-lantern-2',
        by: 'ines@quarrylane.example',
        daysAgo: 12,
        note: 'Cherry hearts in the diamonds, as Harriet asked after seeing the first pattern.',
      },
      {
        file: 'ferry-hall-lantern-3',
        by: 'ines@quarrylane.example',
        daysAgo: 9,
        note: 'The 12.7 mm flutes do not reach through a 14 mm board. Same cutter with 16 mm flutes; pattern as before.',
      },
      { file: 'ferry-hall-lantern-draft', by: 'bela@quarrylane.example', daysAgo: 1 },
    ],
  },
  {
    title: 'Rehearsal floor drum',
    workshop: QUARRY_LANE,
    client: 'Lowgate Youth Band',
    due: '2027-01-29',
    stage: 'cutting',
    states: [
      {
        file: 'rehearsal-floor-drum-1',
        by: 'runa@quarrylane.example',
        daysAgo: 40,
        note: 'Helix with a lead of seven courses; it meets itself at the seam four times round.',
      },
      {
        file: 'rehearsal-floor-drum-2',
        by: 'bela@quarrylane.example',
        daysAgo: 33,
        note: 'A cherry edge on the walnut band.',
      },
    ],
  },
  {
    title: 'Stair planter, tall',
    workshop: QUARRY_LANE,
    client: 'Mill Street Housing Co-operative',
    due: '2027-05-07',
    stage: 'design',
    states: [
      {
        file: 'stair-planter-tall-1',
        by: 'bela@quarrylane.example',
        daysAgo: 6,
        note: 'Zigzag between dark ends. At this height the trim line leaves under 2 mm beside the stave joint, hence the caution: ask whether 424 mm would do.',
      },
    ],
  },
  {
    title: 'Bedside drum table',
    workshop: QUARRY_LANE,
    client: 'Ottoline Reyes',
    due: '2027-02-26',
    stage: 'approved',
    states: [
      {
        file: 'bedside-drum-table-1',
        by: 'runa@quarrylane.example',
        daysAgo: 30,
        note: 'Plain checker, forty staves.',
      },
      {
        file: 'bedside-drum-table-2',
        by: 'ines@quarrylane.example',
        daysAgo: 17,
        note: 'Checks two staves wide and a dark course at each end; reads better from the bed.',
      },
    ],
  },
  {
    title: 'Test ring for the new cutter',
    workshop: QUARRY_LANE,
    client: null,
    due: null,
    stage: 'design',
    states: [
      {
        file: 'test-ring-for-the-new-cutter-1',
        by: 'tomas@quarrylane.example',
        daysAgo: 3,
        note: 'Kept to show the stop: the 1.40 mm fillet suited the old 2.8 mm cutter, the new 3.175 mm one cannot enter it. Widen the fillet before cutting.',
      },
    ],
  },
];
