import { HttpClient, type HttpEvent } from '@angular/common/http';
import { inject, Injectable } from '@angular/core';
import type { BundleRequest } from '@shared/api/bundle';
import type { RestoreVersion, VersionDetail, VersionKept, VersionList } from '@shared/api/version';
import { firstValueFrom, type Observable } from 'rxjs';

/** The requests about a layout's versions. All fail with an ApiFailure. */
@Injectable({ providedIn: 'root' })
export class VersionsApi {
  private readonly http = inject(HttpClient);

  /** Every version kept, in the server's order. */
  list(layoutId: string): Promise<VersionList> {
    return firstValueFrom(this.http.get<VersionList>(`/api/layouts/${layoutId}/versions`));
  }

  /** One version with its layout. */
  detail(layoutId: string, number: number): Promise<VersionDetail> {
    return firstValueFrom(this.http.get<VersionDetail>(versionPath(layoutId, number)));
  }

  restore(layoutId: string, number: number, note: RestoreVersion): Promise<VersionKept> {
    return firstValueFrom(
      this.http.post<VersionKept>(`${versionPath(layoutId, number)}/restore`, note),
    );
  }

  /** The bundle of a version as a ZIP, with the events of its arrival. */
  bundle(layoutId: string, number: number, request: BundleRequest): Observable<HttpEvent<Blob>> {
    return this.http.post(`${versionPath(layoutId, number)}/bundle`, request, {
      observe: 'events',
      reportProgress: true,
      responseType: 'blob',
    });
  }
}

/** Where a version's layout file is downloaded from. */
export function versionFilePath(layoutId: string, number: number): string {
  return `${versionPath(layoutId, number)}/file`;
}

function versionPath(layoutId: string, number: number): string {
  return `/api/layouts/${layoutId}/versions/${number}`;
}
