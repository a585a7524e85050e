import { HttpClient, type HttpResponse } from '@angular/common/http';
import { DOCUMENT, inject, Injectable } from '@angular/core';
import { firstValueFrom } from 'rxjs';
import { saveFile } from './save-file';

/** Fetches files through HttpClient, so that a refusal comes out as a sentence instead of a broken file. */
@Injectable({ providedIn: 'root' })
export class Downloads {
  private readonly http = inject(HttpClient);
  private readonly document = inject(DOCUMENT);

  /** Saves the answer of a GET under the name the server gives it, or else `name`; rejects with an ApiFailure. */
  async get(url: string, name: string): Promise<void> {
    const answer = this.http.get(url, { responseType: 'blob', observe: 'response' });
    this.save(await firstValueFrom(answer), name);
  }

  private save(answer: HttpResponse<Blob>, name: string): void {
    if (answer.body === null) return;
    const given = fileNameIn(answer.headers.get('Content-Disposition'));
    saveFile(this.document, answer.body, given ?? name);
  }
}

/** The file's name in a Content-Disposition header (RFC 6266), the encoded one first; null when there is none. */
export function fileNameIn(disposition: string | null): string | null {
  if (disposition === null) return null;
  const encoded = /filename\*=UTF-8''([^;]+)/i.exec(disposition)?.[1];
  if (encoded !== undefined) {
    try {
      return decodeURIComponent(encoded);
    } catch {
      // A broken encoding leaves the plain name.
    }
  }
  const quoted = /filename="((?:[^"\\]|\\.)*)"/i.exec(disposition)?.[1];
  return quoted?.replace(/\\(.)/g, '$1') ?? /filename=([^\s;"]+)/i.exec(disposition)?.[1] ?? null;
}
