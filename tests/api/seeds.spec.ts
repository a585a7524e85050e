import { openDatabase, type OpenDatabase } from '@drizzle/database';
import { commissions, layoutEdits, layouts, people, versions } from '@drizzle/schema/index';
import { seedDatabase } from '@seeds/seed';
import { patchOfWire } from '@shared/api/wire-patch';
import { runChecks } from '@shared/checks/run-checks';
import { invertPatch, applyPatch } from '@shared/layout/patch';
import { readLayout } from '@shared/layout/read-layout';
import type { Layout, LayoutFile } from '@shared/layout/schema';
import { and, desc, eq } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { freshDatabase, type FreshDatabase } from '../database';

let fresh: FreshDatabase;
let open: OpenDatabase;
beforeAll(async () => {
  fresh = await freshDatabase();
  open = openDatabase(fresh.url, { onConnectionLost: () => undefined });
});
afterAll(async () => {
  await open.close();
  await fresh.drop();
});

function layoutIn(document: LayoutFile | undefined): Layout {
  const reading = readLayout(document);
  if (!reading.ok) throw new Error('the document cannot be read');
  return reading.layout;
}

async function worstOf(title: string, number: number): Promise<string[]> {
  const [row] = await open.database
    .select({ document: versions.document })
    .from(versions)
    .innerJoin(layouts, eq(layouts.id, versions.layoutId))
    .innerJoin(commissions, eq(commissions.id, layouts.commissionId))
    .where(and(eq(commissions.title, title), eq(versions.number, number)));
  return runChecks(layoutIn(row?.document))
    .filter(({ result }) => result !== 'clear')
    .map(({ key, result }) => `${key} ${result}`);
}

describe('the demonstration', () => {
  it('leaves a database with other people alone until it is asked to join them', async () => {
    const stranger = { name: 'Somebody', email: 'somebody@else.example', passwordHash: 'none' };
    await open.database.insert(people).values(stranger);
    expect(await seedDatabase(fresh.url, { amongOthers: 'leave alone' })).toBe('left alone');
    expect(await open.database.$count(people)).toBe(1);
    expect(await seedDatabase(fresh.url, { amongOthers: 'add' })).toBe('seeded');
    expect(await open.database.$count(people)).toBe(7);
  });

  it('is put in once, also when two start together', async () => {
    const again = { amongOthers: 'add' } as const;
    const results = await Promise.all([
      seedDatabase(fresh.url, again),
      seedDatabase(fresh.url, again),
    ]);
    expect(results).toEqual(['there already', 'there already']);
    expect(await open.database.$count(commissions)).toBe(5);
  });

  it('shows a caution and a stop where its notes say so, and is clear elsewhere', async () => {
    expect(await worstOf('Ferry-hall lantern', 1)).toEqual(['flute stop']);
    expect(await worstOf('Ferry-hall lantern', 3)).toEqual([]);
    expect(await worstOf('Rehearsal floor drum', 2)).toEqual([]);
    expect(await worstOf('Bedside drum table', 2)).toEqual([]);
    expect(await worstOf('Stair planter, tall', 1)).toEqual(['trim caution']);
    expect(await worstOf('Test ring for the new cutter', 1)).toEqual(['inside-radius stop']);
  });

  it('has patterns that go on across the seam', async () => {
    const rows = await open.database.select({ document: layouts.document }).from(layouts);
    for (const { document } of rows) {
      const { shell, cells, name } = layoutIn(document);
      const repeats = [2, 4, 6, 7, 8, 16].filter(
        (period) =>
          shell.staves % period === 0 &&
          cells.every((wood, p) => {
            const stave = (p % shell.staves) + period;
            const course = Math.floor(p / shell.staves);
            return wood === cells[course * shell.staves + (stave % shell.staves)];
          }),
      );
      expect(repeats, name).not.toEqual([]);
    }
  });

  it('has a log of edits that leads back from each draft to its first version', async () => {
    const rows = await open.database.select().from(layouts);
    for (const { id, document, revision } of rows) {
      const edits = await open.database
        .select()
        .from(layoutEdits)
        .where(eq(layoutEdits.layoutId, id))
        .orderBy(desc(layoutEdits.revision));
      expect(edits).toHaveLength(revision);
      const back = edits.flatMap(({ patch }) => invertPatch(patchOfWire(patch) ?? []));
      const [first] = await open.database
        .select()
        .from(versions)
        .where(and(eq(versions.layoutId, id), eq(versions.number, 1)));
      expect(applyPatch(layoutIn(document), back)).toEqual(layoutIn(first?.document));
    }
  });
});
