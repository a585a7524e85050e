/** Finding one's way in the demonstration, and making edits on it. */
import { randomUUID } from 'node:crypto';
import { commissionListSchema, commissionSchema, type Commission } from '@shared/api/commission';
import {
  editSavedSchema,
  openLayoutSchema,
  type Edit,
  type EditSaved,
  type OpenLayout,
} from '@shared/api/layout';
import { problemSchema, type ApiProblem } from '@shared/api/problem';
import { wirePatchOf } from '@shared/api/wire-patch';
import { fieldChange, type Patch } from '@shared/layout/patch';
import { readLayout } from '@shared/layout/read-layout';
import type { Layout } from '@shared/layout/schema';
import type { Answer, Browser } from './browser';

/** The commission with this title, as the browser's person sees it. */
export async function commissionTitled(browser: Browser, title: string): Promise<Commission> {
  const { commissions } = commissionListSchema.parse((await browser.get('/commissions')).body);
  const found = commissions.find((commission) => commission.title === title);
  if (!found) throw new Error(`there is no commission ${title}`);
  return found;
}

/** A new commission of the browser's person with the starting layout. */
export async function newCommission(browser: Browser, title = 'Bench trial'): Promise<Commission> {
  return commissionSchema.parse((await browser.post('/commissions', { title })).body);
}

/** The draft of a layout. */
export async function openLayout(browser: Browser, layoutId: string): Promise<OpenLayout> {
  return openLayoutSchema.parse((await browser.get(`/layouts/${layoutId}`)).body);
}

/** The draft as a layout to work on. */
export async function draftOf(browser: Browser, layoutId: string): Promise<Layout> {
  const reading = readLayout((await openLayout(browser, layoutId)).layout);
  if (!reading.ok) throw new Error('the draft cannot be read');
  return reading.layout;
}

/** An edit as the app sends it. */
export function editOf(baseRevision: number, patch: Patch): Edit {
  return { baseRevision, idempotencyKey: randomUUID(), patch: wirePatchOf(patch) };
}

/** The patch that sets one field of the draft. */
export async function setting(
  browser: Browser,
  layoutId: string,
  ...[path, value]: Parameters<typeof fieldChange> extends [Layout, infer P, infer V]
    ? [P, V]
    : never
): Promise<Patch> {
  const change = fieldChange(await draftOf(browser, layoutId), path, value);
  if (!change) throw new Error(`${path} has that value already`);
  return [change];
}

/** Lays wood 1 on some tiles that held wood 0. */
export function laid(...positions: number[]): Patch {
  return [
    {
      kind: 'cells',
      positions,
      before: positions.map(() => 0),
      after: positions.map(() => 1),
    },
  ];
}

/** The answer to an edit that was saved. */
export function saved(answer: Answer): EditSaved {
  return editSavedSchema.parse(answer.body);
}

/** The problem an answer holds; throws when its status is another or it is no `ApiProblem`. */
export function problem(answer: Answer, status: number): ApiProblem {
  if (answer.status !== status) {
    throw new Error(`answered ${answer.status}: ${JSON.stringify(answer.body)}`);
  }
  return problemSchema.parse(answer.body);
}
