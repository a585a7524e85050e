/**
 * Two people edit one layout through a server that answers, refuses, or loses its answer on the way back.
 * Whatever the order, both end with the server's document.
 */
import fc from 'fast-check';
import { expect, test } from 'vitest';
import type { EditSaved, RecordedEdit } from '@shared/api/layout';
import { wirePatchOf } from '@shared/api/wire-patch';
import {
  applyPatch,
  fieldChange,
  layChange,
  overlapOf,
  type Change,
  type Patch,
} from '@shared/layout/patch';
import type { Contest } from '@shared/layout/rebase';
import { resizeChange } from '@shared/layout/carry';
import type { Layout } from '@shared/layout/schema';
import { smallLayout } from '@shared/layout/small-layout.fixture';
import {
  isSaved,
  madeChanges,
  openDraft,
  withAnswer,
  withEdit,
  withLive,
  withSave,
  withTheirs,
  type Draft,
  type Met,
  type Save,
} from '../../src/app/layout/draft';
import { FIXED_SEED } from './fixed-seed';

interface Edit {
  readonly patch: Patch;
  readonly by: string;
  readonly key: string;
}

interface Answer {
  readonly kind: 'saved' | 'conflict';
  readonly body: EditSaved;
}

/** The merge rule of the API: edits that do not overlap merge, the rest is refused with what changed. */
class SimulatedServer {
  layout = smallLayout();
  private readonly edits: Edit[] = [];
  private readonly answers = new Map<string, Answer>();

  save(by: string, save: Save): Answer {
    const known = this.answers.get(save.key);
    if (known) return known;
    const since = this.edits.slice(save.baseRevision);
    const others = since.map((edit, i) => recorded(edit, save.baseRevision + i + 1));
    if (since.some((edit) => overlapOf(edit.patch, save.patch) !== null)) {
      return { kind: 'conflict', body: { revision: this.edits.length, others } };
    }
    this.layout = applyPatch(this.layout, save.patch);
    this.edits.push({ patch: save.patch, by, key: save.key });
    const answer: Answer = { kind: 'saved', body: { revision: this.edits.length, others } };
    this.answers.set(save.key, answer);
    return answer;
  }

  /** The edit that made a revision, as the live stream brings it; null when there is none yet. */
  edit(revision: number): RecordedEdit | null {
    const edit = this.edits[revision - 1];
    return edit ? recorded(edit, revision) : null;
  }
}

function recorded(edit: Edit, revision: number): RecordedEdit {
  const id = '00000000-0000-4000-8000-000000000000';
  return {
    revision,
    patch: wirePatchOf(edit.patch),
    by: { id, name: edit.by },
    idempotencyKey: edit.key,
  };
}

class Client {
  draft: Draft = openDraft(smallLayout(), 0);
  private saves = 0;

  constructor(
    private readonly name: string,
    private readonly server: SimulatedServer,
    private readonly keepsMine: () => boolean,
  ) {}

  edit(make: (layout: Layout) => Change | null): void {
    const patch = madeChanges([make(this.draft.local)]);
    if (patch.length > 0) this.draft = withEdit(this.draft, patch);
  }

  /** The stream brings the next edit. */
  hear(): void {
    const edit = this.server.edit(this.draft.revision + 1);
    const met = edit && withLive(this.draft, edit);
    if (met) this.settle(met);
  }

  save(way: 'answered' | 'answer lost'): void {
    this.saves += 1;
    this.draft = withSave(this.draft, `${this.name} ${this.saves}`);
    if (!this.draft.inFlight) return;
    const { kind, body } = this.server.save(this.name, this.draft.inFlight);
    if (way === 'answer lost') return;
    this.settle(kind === 'saved' ? withAnswer(this.draft, body) : withTheirs(this.draft, body));
  }

  private settle({ draft, contests }: Met): void {
    this.draft = draft;
    const standing = draft.inFlight ? [draft.inFlight.standing] : [];
    const mine = [...standing, ...draft.waiting];
    expect(mine.reduce(applyPatch, draft.confirmed)).toEqual(draft.local);
    for (const contest of contests) {
      if (this.keepsMine()) this.edit((layout) => mineAgain(layout, contest));
    }
  }
}

function mineAgain(layout: Layout, contest: Contest): Change | null {
  return contest.kind === 'field'
    ? fieldChange(layout, contest.mine.path, contest.mine.after)
    : resizeChange(layout, contest.mine);
}

const editOf = fc.oneof(
  {
    weight: 6,
    arbitrary: fc
      .tuple(fc.array(fc.nat(40), { minLength: 1, maxLength: 6 }), fc.nat(3))
      .map(([tiles, wood]) => (layout: Layout) => {
        const positions = tiles.map((tile) => tile % layout.cells.length);
        return layChange(layout.cells, positions, wood);
      }),
  },
  {
    weight: 3,
    arbitrary: fc
      .constantFrom(20, 24, 28, 30)
      .map((width) => (layout: Layout) => fieldChange(layout, 'shell.tileWidth', width)),
  },
  {
    weight: 1,
    arbitrary: fc
      .record({ staves: fc.constantFrom(6, 8, 9), courses: fc.constantFrom(2, 3, 4) })
      .map((grid) => (layout: Layout) => resizeChange(layout, grid)),
  },
);

const script = fc.array(
  fc.record({
    who: fc.nat(1),
    act: fc.oneof(
      editOf,
      fc.constantFrom('answered' as const, 'answer lost' as const, 'hear' as const),
    ),
  }),
  { maxLength: 40 },
);

test('two clients converge on the document of the server', () => {
  const choices = fc.infiniteStream(fc.boolean());
  fc.assert(
    fc.property(script, choices, (steps, keepMine) => {
      const server = new SimulatedServer();
      const keepsMine = () => keepMine.next().value === true;
      const runa = new Client('Runa', server, keepsMine);
      const ines = new Client('Ines', server, keepsMine);
      for (const { who, act } of steps) {
        const client = who === 0 ? runa : ines;
        if (act === 'hear') client.hear();
        else if (typeof act === 'string') client.save(act);
        else client.edit(act);
      }
      comeToRest([runa, ines]);
      catchUp(runa, ines);
      expect(runa.draft.local).toEqual(server.layout);
      expect({ ...ines.draft.local, build: server.layout.build }).toEqual(server.layout);
      const { staves, courses } = server.layout.shell;
      expect(server.layout.cells).toHaveLength(staves * courses);
    }),
    { ...FIXED_SEED, numRuns: 400 },
  );
});

/** Saves in turn until nobody has anything left. */
function comeToRest(clients: readonly Client[]): void {
  for (let round = 0; round < 60; round++) {
    if (clients.every((client) => isSaved(client.draft))) return;
    for (const client of clients) client.save('answered');
  }
  throw new Error('The clients do not come to rest');
}

/** News arrives with answers only: each saves a small thing nobody else touches, the first one twice. */
function catchUp(runa: Client, ines: Client): void {
  runa.edit((layout) => fieldChange(layout, 'build.spareMinimum', 7));
  comeToRest([runa]);
  ines.edit((layout) => fieldChange(layout, 'build.spareShare', 0.3));
  comeToRest([ines]);
  runa.edit((layout) => fieldChange(layout, 'build.turnOver', false));
  comeToRest([runa]);
}
