import { randomUUID } from 'node:crypto';
import { readFileSync } from 'node:fs';
import type { Transaction } from '@drizzle/database';
import { commissions, layoutEdits, layouts, versions } from '@drizzle/schema/index';
import { summaryOf } from '@shared/api/layout-summary';
import { wirePatchOf } from '@shared/api/wire-patch';
import { patchBetween } from '@shared/layout/patch';
import { layoutFileOf, readLayoutText } from '@shared/layout/read-layout';
import type { Layout } from '@shared/layout/schema';
import { thumbnailOf } from '@shared/layout/thumbnail';
import { eq } from 'drizzle-orm';
import type { SeedCommission, SeedState } from './demonstration';

/** What the seeding has made so far: ids by workshop name and by e-mail address. */
export interface Planting {
  readonly transaction: Transaction;
  readonly workshops: ReadonlyMap<string, string>;
  readonly people: ReadonlyMap<string, string>;
  readonly now: Date;
}

interface PlantedLayout {
  readonly id: string;
  revision: number;
  version: number;
  layout: Layout;
}

/** Puts a commission in, its states one after another, each as the edit that leads to it. */
export async function seedCommission(
  planting: Planting,
  { workshop, states, ...commission }: SeedCommission,
): Promise<void> {
  const [first] = states;
  if (!first) throw new Error(`the commission ${commission.title} has no layout`);
  const begun = daysBefore(planting.now, first.daysAgo);
  const [made] = await planting.transaction
    .insert(commissions)
    .values({
      ...commission,
      workshopId: planting.workshops.get(workshop) ?? '',
      createdAt: begun,
      updatedAt: begun,
    })
    .returning({ id: commissions.id });
  const planted = await plantLayout(planting, made?.id ?? '', first);
  for (const state of states) await plantState(planting, planted, state);
}

async function plantLayout(
  { transaction }: Planting,
  commissionId: string,
  { file }: SeedState,
): Promise<PlantedLayout> {
  const layout = layoutFrom(file);
  const [made] = await transaction
    .insert(layouts)
    .values({ commissionId, document: layoutFileOf(layout), summary: summaryOf(layout) })
    .returning({ id: layouts.id });
  return { id: made?.id ?? '', revision: 0, version: 0, layout };
}

async function plantState(
  planting: Planting,
  planted: PlantedLayout,
  state: SeedState,
): Promise<void> {
  const layout = layoutFrom(state.file);
  const personId = planting.people.get(state.by) ?? '';
  const at = daysBefore(planting.now, state.daysAgo);
  await plantEdit(planting, planted, layout, { personId, at });
  if (state.note === undefined) return;
  planted.version += 1;
  await planting.transaction.insert(versions).values({
    layoutId: planted.id,
    number: planted.version,
    document: layoutFileOf(layout),
    note: state.note,
    keptBy: personId,
    keptAt: at,
    revision: planted.revision,
    thumbnail: thumbnailOf(layout),
  });
}

async function plantEdit(
  { transaction }: Planting,
  planted: PlantedLayout,
  layout: Layout,
  { personId, at }: { readonly personId: string; readonly at: Date },
): Promise<void> {
  const patch = patchBetween(planted.layout, layout);
  if (patch.length > 0) {
    await transaction.insert(layoutEdits).values({
      layoutId: planted.id,
      revision: planted.revision + 1,
      baseRevision: planted.revision,
      patch: wirePatchOf(patch),
      authorId: personId,
      idempotencyKey: randomUUID(),
      requestDigest: 'seed',
      createdAt: at,
    });
    planted.revision += 1;
    planted.layout = layout;
  }
  await transaction
    .update(layouts)
    .set({
      document: layoutFileOf(layout),
      summary: summaryOf(layout),
      revision: planted.revision,
      updatedAt: at,
    })
    .where(eq(layouts.id, planted.id));
}

function layoutFrom(file: string): Layout {
  const text = readFileSync(new URL(`./layouts/${file}.json`, import.meta.url), 'utf8');
  const reading = readLayoutText(text);
  if (reading.ok) return reading.layout;
  throw new Error(`seeds/layouts/${file}.json cannot be read: ${JSON.stringify(reading.problems)}`);
}

/** At half past nine in the morning, so that the demonstration does not look made at night. */
function daysBefore(now: Date, days: number): Date {
  const day = new Date(now.getTime() - days * 86_400_000);
  day.setUTCHours(9, 30, 0, 0);
  return day;
}
