import { HttpClient } from '@angular/common/http';
import { inject, Injectable } from '@angular/core';
import type { Commission } from '@shared/api/commission';
import type { Edit, EditSaved, OpenLayout } from '@shared/api/layout';
import type { KeepVersion, VersionKept } from '@shared/api/version';
import { firstValueFrom } from 'rxjs';

/** The requests of an open layout. All reject with an ApiFailure. */
@Injectable({ providedIn: 'root' })
export class LayoutApi {
  private readonly http = inject(HttpClient);

  /** The layout of a commission, with its draft. */
  async open(commissionId: string): Promise<OpenLayout> {
    const commission = await firstValueFrom(
      this.http.get<Commission>(`/api/commissions/${commissionId}`),
    );
    return firstValueFrom(this.http.get<OpenLayout>(`/api/layouts/${commission.layoutId}`));
  }

  save(layoutId: string, edit: Edit): Promise<EditSaved> {
    return firstValueFrom(this.http.patch<EditSaved>(`/api/layouts/${layoutId}`, edit));
  }

  /** Like `save`, but the browser finishes sending it after the page is gone (bodies up to 64 kB). */
  saveLeaving(layoutId: string, edit: Edit): Promise<EditSaved> {
    const request = this.http.patch<EditSaved>(`/api/layouts/${layoutId}`, edit, {
      keepalive: true,
    });
    return firstValueFrom(request);
  }

  keepVersion(layoutId: string, version: KeepVersion): Promise<VersionKept> {
    return firstValueFrom(
      this.http.post<VersionKept>(`/api/layouts/${layoutId}/versions`, version),
    );
  }
}
