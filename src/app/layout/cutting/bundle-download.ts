import { HttpEventType, type HttpEvent } from '@angular/common/http';
import { DOCUMENT, inject, Injectable, signal, type OnDestroy } from '@angular/core';
import type { BundleRequest } from '@shared/api/bundle';
import type { CheckResult } from '@shared/checks/check';
import { Subscription } from 'rxjs';
import { apiFailureOf, type ApiFailure } from '../../platform/api-problem';
import { saveFile } from '../../platform/save-file';
import { VersionsApi } from '../versions-api';

/** Which bundle, of which layout, and under what name it is saved. */
export interface BundleOrder {
  readonly layoutId: string;
  readonly version: number;
  readonly fileName: string;
  readonly request: BundleRequest;
}

export type BundleState =
  | { readonly kind: 'idle' }
  | { readonly kind: 'making'; readonly order: BundleOrder }
  | {
      readonly kind: 'arriving';
      readonly order: BundleOrder;
      readonly received: number;
      readonly total: number | null;
    }
  | { readonly kind: 'saved'; readonly order: BundleOrder; readonly size: number }
  | {
      readonly kind: 'stopped';
      readonly order: BundleOrder;
      readonly checks: readonly CheckResult[];
    }
  | { readonly kind: 'failed'; readonly order: BundleOrder; readonly failure: ApiFailure };

/** Asks the server for a bundle and saves it; one at a time, told as a state. */
@Injectable()
export class BundleDownload implements OnDestroy {
  private readonly api = inject(VersionsApi);
  private readonly document = inject(DOCUMENT);
  private readonly current = signal<BundleState>({ kind: 'idle' });
  private arriving = Subscription.EMPTY;

  readonly state = this.current.asReadonly();

  ngOnDestroy(): void {
    this.arriving.unsubscribe();
  }

  /** Starts over with another order; what was under way is given up. */
  start(order: BundleOrder): void {
    this.arriving.unsubscribe();
    this.current.set({ kind: 'making', order });
    this.arriving = this.api.bundle(order.layoutId, order.version, order.request).subscribe({
      next: (event) => this.take(order, event),
      error: (thrown: unknown) => this.fail(order, apiFailureOf(thrown)),
    });
  }

  /** Gives up what is under way and forgets how the last one ended. */
  forget(): void {
    this.arriving.unsubscribe();
    this.current.set({ kind: 'idle' });
  }

  private take(order: BundleOrder, event: HttpEvent<Blob>): void {
    if (event.type === HttpEventType.DownloadProgress) {
      const { loaded, total } = event;
      this.current.set({ kind: 'arriving', order, received: loaded, total: total ?? null });
    } else if (event.type === HttpEventType.Response && event.body) {
      saveFile(this.document, event.body, order.fileName);
      this.current.set({ kind: 'saved', order, size: event.body.size });
    }
  }

  private fail(order: BundleOrder, failure: ApiFailure): void {
    const checks = failure.code === 'stopped' ? stopsIn(failure.body) : [];
    this.current.set(
      checks.length > 0 ? { kind: 'stopped', order, checks } : { kind: 'failed', order, failure },
    );
  }
}

/** The stops a refused bundle carries; none when the answer has another shape. */
export function stopsIn(body: unknown): CheckResult[] {
  const checks: unknown = (body as { readonly checks?: unknown } | null)?.checks;
  if (!Array.isArray(checks)) return [];
  return checks.filter(isCheck).filter((check) => check.result === 'stop');
}

function isCheck(value: unknown): value is CheckResult {
  if (typeof value !== 'object' || value === null) return false;
  const parts = ['key', 'result', 'title', 'finding', 'reason', 'remedy'];
  return parts.every((part) => typeof (value as Record<string, unknown>)[part] === 'string');
}
