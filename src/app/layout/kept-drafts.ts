/**
 * Unsaved edits kept in the browser's own database, so that they survive a reload, a crash and a night
 * without a network. What is kept is the draft itself: the document as it was confirmed, its revision, the
 * save under way with its key, and what waits. Brought back, it meets what others did since like any draft.
 */
import { DOCUMENT, inject, Injectable } from '@angular/core';
import { patchSchema } from '@shared/api/layout';
import { patchOfWire, wirePatchOf } from '@shared/api/wire-patch';
import { applyPatch, type Patch } from '@shared/layout/patch';
import { layoutFileOf, readLayout } from '@shared/layout/read-layout';
import { openDB, type IDBPDatabase } from 'idb';
import * as z from 'zod';
import type { Draft } from './draft';

const DATABASE = 'staveloom';
const STORE = 'kept-drafts';

const saveSchema = z.object({
  key: z.uuid(),
  baseRevision: z.int(),
  patch: patchSchema,
  standing: z.array(patchSchema.element),
});
const keptSchema = z.object({
  revision: z.int(),
  confirmed: z.unknown(),
  inFlight: saveSchema.nullable(),
  waiting: z.array(z.array(patchSchema.element)),
});

/** One open draft's place in the browser's database, held by one page at a time. */
export interface DraftKeeper {
  /** What an earlier page left unsaved, or null. */
  readonly found: Draft | null;
  /** Keeps what is unsaved, or forgets it when all is saved. */
  keep(draft: Draft): void;
  /** Lets go of the place; what is kept there stays. */
  leave(): void;
}

@Injectable({ providedIn: 'root' })
export class KeptDrafts {
  private readonly locks = inject(DOCUMENT).defaultView?.navigator.locks;

  /**
   * A place for somebody's draft of a layout: one that an earlier page left behind with unsaved edits, or a
   * new one. Another open page's place is never taken: it holds a lock as long as it lives.
   */
  async claim(personId: string, layoutId: string): Promise<DraftKeeper> {
    const prefix = `${personId} ${layoutId} `;
    try {
      const database = await openKept();
      for (const key of await database.getAllKeys(STORE)) {
        if (typeof key !== 'string' || !key.startsWith(prefix)) continue;
        const release = await this.lock(key);
        if (!release) continue;
        const found = draftOf(await database.get(STORE, key));
        if (found) return new Keeper(database, key, found, release);
        release();
      }
      const key = prefix + crypto.randomUUID();
      return new Keeper(database, key, null, (await this.lock(key)) ?? nothing);
    } catch {
      // a browser without this database (private windows of some) still saves to the server
      return { found: null, keep: nothing, leave: nothing };
    }
  }

  /** Resolves to what releases the lock, or null when another page holds it. */
  private lock(name: string): Promise<(() => void) | null> {
    const { locks } = this;
    // without locks (a page not served securely) a place may be taken while its page still lives
    if (!locks) return Promise.resolve(nothing);
    return new Promise((resolve, reject) => {
      locks
        .request(name, { ifAvailable: true }, (lock) => {
          if (lock) return new Promise<void>((release) => resolve(release));
          resolve(null);
          return undefined;
        })
        .catch(reject);
    });
  }
}

class Keeper implements DraftKeeper {
  private writing: Promise<void> = Promise.resolve();

  constructor(
    private readonly database: IDBPDatabase,
    private readonly key: string,
    readonly found: Draft | null,
    private readonly release: () => void,
  ) {}

  keep(draft: Draft): void {
    const saved = !draft.inFlight && draft.waiting.length === 0;
    // one after another: an older draft must never be written over a newer one
    this.writing = this.writing.then(async () => {
      try {
        if (saved) await this.database.delete(STORE, this.key);
        else await this.database.put(STORE, keptOf(draft), this.key);
      } catch {
        // the disk is full or the browser cleared its data: the server still has all but the last edits
      }
    });
  }

  leave(): void {
    void this.writing.then(this.release);
  }
}

function nothing(): void {
  // there is nothing to release or to keep
}

function openKept(): Promise<IDBPDatabase> {
  return openDB(DATABASE, 1, {
    upgrade: (database) => {
      database.createObjectStore(STORE);
    },
  });
}

function keptOf({ confirmed, revision, inFlight, waiting }: Draft) {
  return {
    revision,
    confirmed: layoutFileOf(confirmed),
    inFlight: inFlight && {
      ...inFlight,
      patch: wirePatchOf(inFlight.patch),
      standing: wirePatchOf(inFlight.standing),
    },
    waiting: waiting.map(wirePatchOf),
  };
}

function draftOf(record: unknown): Draft | null {
  const kept = keptSchema.safeParse(record);
  const reading = kept.success ? readLayout(kept.data.confirmed) : null;
  if (!kept.success || !reading?.ok) return null;
  const { revision, inFlight } = kept.data;
  const waiting = kept.data.waiting.map(patchOfWire);
  const patch = inFlight && patchOfWire(inFlight.patch);
  const standing = inFlight && patchOfWire(inFlight.standing);
  if (waiting.some((waits) => waits === null) || (inFlight && (!patch || !standing))) return null;
  const mine: Patch[] = [...(standing ? [standing] : []), ...(waiting as Patch[])];
  return {
    confirmed: reading.layout,
    revision,
    inFlight:
      inFlight && patch && standing
        ? { key: inFlight.key, baseRevision: inFlight.baseRevision, patch, standing }
        : null,
    waiting: waiting as Patch[],
    gesture: null,
    local: mine.reduce(applyPatch, reading.layout),
  };
}
