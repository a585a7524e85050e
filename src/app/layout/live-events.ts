/**
 * What others do in the open layout, as it happens: their saved edits in order and who is here. The browser
 * connects again by itself after a break and names the last edit it has seen, so nothing is lost; where the
 * server turned it away for good (a session that ended, a database that is down) it is asked again with
 * growing pauses.
 */
import { HttpClient } from '@angular/common/http';
import { DOCUMENT, inject, Injectable, signal, type OnDestroy } from '@angular/core';
import { recordedEditSchema, type RecordedEdit } from '@shared/api/layout';
import { liveEventSchemas, type Present, type Whereabouts } from '@shared/api/live';
import { auditTime, catchError, EMPTY, Subject, switchMap, type Subscription } from 'rxjs';

const RETRY_FIRST = 2_000;
const RETRY_MOST = 60_000;
/** A pointer moves faster than anybody needs to know. */
const TELL_EVERY = 400;

interface Watched {
  readonly layoutId: string;
  /** The revision the draft has by now. */
  readonly since: () => number;
  readonly onEdit: (edit: RecordedEdit) => void;
}

@Injectable()
export class LiveEvents implements OnDestroy {
  private readonly http = inject(HttpClient);
  private readonly window = inject(DOCUMENT).defaultView;
  private readonly connection = crypto.randomUUID();
  private readonly present = signal<readonly Present[]>([]);
  private readonly moves = new Subject<Whereabouts>();
  private readonly telling: Subscription;
  private watched: Watched | null = null;
  private source: EventSource | null = null;
  private where: Pick<Whereabouts, 'station' | 'tile'> = { station: 'shell', tile: null };
  private timer: ReturnType<typeof setTimeout> | undefined;
  private failures = 0;

  /** Everybody else who has the layout open. */
  readonly people = this.present.asReadonly();

  constructor() {
    this.telling = this.moves
      .pipe(
        auditTime(TELL_EVERY),
        switchMap((whereabouts) => this.post(whereabouts)),
      )
      .subscribe();
  }

  ngOnDestroy(): void {
    this.telling.unsubscribe();
    this.stop();
  }

  /** Watches a layout until another one is watched or the page is left. */
  watch(watched: Watched): void {
    this.stop();
    this.watched = watched;
    this.connect();
  }

  /** Says where this person is now. */
  moveTo(where: Partial<Pick<Whereabouts, 'station' | 'tile'>>): void {
    this.where = { ...this.where, ...where };
    this.moves.next({ connection: this.connection, ...this.where });
  }

  /** Connects at once, as when the network is back. */
  retry(): void {
    if (this.watched && this.source?.readyState !== EventSource.OPEN) this.connect();
  }

  private stop(): void {
    clearTimeout(this.timer);
    this.source?.close();
    this.source = null;
    this.watched = null;
    this.present.set([]);
  }

  private connect(): void {
    const { watched } = this;
    if (!watched || !this.window || !('EventSource' in this.window)) return;
    clearTimeout(this.timer);
    this.source?.close();
    const query = new URLSearchParams({
      since: String(watched.since()),
      connection: this.connection,
    });
    const source = new EventSource(`/api/layouts/${watched.layoutId}/events?${query}`);
    this.source = source;
    source.addEventListener('open', () => {
      this.failures = 0;
      this.moveTo({});
    });
    source.addEventListener('edit', (event: MessageEvent<string>) => {
      const edit = recordedEditSchema.safeParse(parsed(event.data));
      if (edit.success) watched.onEdit(edit.data);
    });
    source.addEventListener('people', (event: MessageEvent<string>) => {
      const list = liveEventSchemas.people.safeParse(parsed(event.data));
      const people = list.success ? list.data.people : [];
      this.present.set(people.filter(({ connection }) => connection !== this.connection));
    });
    source.addEventListener('error', () => this.failed(source));
  }

  private failed(source: EventSource): void {
    this.present.set([]);
    // otherwise the browser is already connecting again
    if (source.readyState !== EventSource.CLOSED || source !== this.source) return;
    const pause = Math.min(RETRY_FIRST * 2 ** this.failures, RETRY_MOST);
    this.failures += 1;
    this.timer = setTimeout(() => this.connect(), pause);
  }

  private post(whereabouts: Whereabouts) {
    const layoutId = this.watched?.layoutId;
    if (layoutId === undefined) return EMPTY;
    // a place not told is told with the next move
    return this.http
      .post(`/api/layouts/${layoutId}/here`, whereabouts)
      .pipe(catchError(() => EMPTY));
  }
}

function parsed(text: string): unknown {
  try {
    return JSON.parse(text) as unknown;
  } catch {
    return null;
  }
}
