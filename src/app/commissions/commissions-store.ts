import { HttpClient } from '@angular/common/http';
import { inject, Injectable, signal } from '@angular/core';
import type {
  Commission,
  CommissionChanges,
  CommissionList,
  NewCommission,
} from '@shared/api/commission';
import { firstValueFrom, forkJoin } from 'rxjs';
import { apiFailureOf, type ApiFailure } from '../platform/api-problem';

export type ListState =
  | { readonly kind: 'loading' }
  | { readonly kind: 'ready' }
  | { readonly kind: 'failed'; readonly failure: ApiFailure };

/** The workshop's commissions, archived ones too. Every request rejects with an ApiFailure. */
@Injectable()
export class CommissionsStore {
  private readonly http = inject(HttpClient);
  private readonly listState = signal<ListState>({ kind: 'loading' });
  private readonly list = signal<readonly Commission[]>([]);
  readonly state = this.listState.asReadonly();
  readonly commissions = this.list.asReadonly();

  /** Fetches the list; a failure is kept in `state`. */
  async load(): Promise<void> {
    this.listState.set({ kind: 'loading' });
    try {
      const { current, archived } = await firstValueFrom(
        forkJoin({ current: this.fetch('false'), archived: this.fetch('true') }),
      );
      this.list.set([...current.commissions, ...archived.commissions]);
      this.listState.set({ kind: 'ready' });
    } catch (thrown) {
      this.listState.set({ kind: 'failed', failure: apiFailureOf(thrown) });
    }
  }

  async create(commission: NewCommission): Promise<Commission> {
    const made = await firstValueFrom(this.http.post<Commission>('/api/commissions', commission));
    this.list.update((list) => [...list, made]);
    return made;
  }

  async change(id: string, changes: CommissionChanges): Promise<Commission> {
    const changed = await firstValueFrom(
      this.http.patch<Commission>(`/api/commissions/${id}`, changes),
    );
    this.list.update((list) => list.map((one) => (one.id === id ? changed : one)));
    return changed;
  }

  private fetch(archived: 'true' | 'false') {
    return this.http.get<CommissionList>('/api/commissions', { params: { archived } });
  }
}
