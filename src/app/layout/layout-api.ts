import { HttpClient } from '@angular/common/http';
import { inject, Injectable } from '@angular/core';
import type { Commission } from '@shared/api/commission';
import type { Edit, EditSaved, OpenLayout } from '@shared/api/layout';
import type { KeepVersion, VersionKept } from '@shared/api/version';
import { firstValueFrom } from 'rxjs';

/** Whether the page stays while it saves. */
export type SaveWay = 'staying' | 'leaving';

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

  /** "leaving": the browser finishes sending it after the page is gone (bodies up to 64 kB). */
  save(layoutId: string, edit: Edit, way: SaveWay): Promise<EditSaved> {
    const options = { keepalive: way === 'leaving' };
    return firstValueFrom(this.http.patch<EditSaved>(`/api/layouts/${layoutId}`, edit, options));
  }

  keepVersion(layoutId: string, version: KeepVersion): Promise<VersionKept> {
    return firstValueFrom(
      this.http.post<VersionKept>(`/api/layouts/${layoutId}/versions`, version),
    );
  }
}
