import { HttpClient } from '@angular/common/http';
import { inject, Injectable } from '@angular/core';
import { PICTURE_BOUNDS, PICTURE_FIELD } from '@shared/api/picture';
import { from, switchMap, throwError, type Observable } from 'rxjs';
import { ApiFailure } from '../../../platform/api-problem';
import type { PicturePixels } from './tile-colours';

/** A picture as the server hands it back. */
export interface ReadPicture {
  readonly name: string;
  readonly blob: Blob;
  readonly pixels: PicturePixels;
}

/** Has pictures prepared by the server, and takes out their pixels. */
@Injectable({ providedIn: 'root' })
export class PictureReading {
  private readonly http = inject(HttpClient);

  /** The picture in a file. Fails with an ApiFailure; unsubscribing stops sending. */
  read(file: File): Observable<ReadPicture> {
    if (file.size > PICTURE_BOUNDS.bytes) return throwError(() => tooLarge(file.size));
    const body = new FormData();
    body.append(PICTURE_FIELD, file, file.name === '' ? 'picture' : file.name);
    return this.http
      .post('/api/pictures/prepared', body, { responseType: 'blob' })
      .pipe(switchMap((blob) => from(pictureIn(blob, file.name))));
  }
}

/** The server would say the same, after all of it had been sent. */
function tooLarge(bytes: number): ApiFailure {
  const megabytes = (Math.ceil((bytes / 1024 / 1024) * 10) / 10).toFixed(1);
  const most = PICTURE_BOUNDS.bytes / 1024 / 1024;
  return new ApiFailure(
    413,
    'too-large',
    `The picture must be at most ${most} MB; this one has ${megabytes} MB. Save it smaller.`,
  );
}

async function pictureIn(blob: Blob, name: string): Promise<ReadPicture> {
  const bitmap = await createImageBitmap(blob);
  const canvas = document.createElement('canvas');
  canvas.width = bitmap.width;
  canvas.height = bitmap.height;
  const context = canvas.getContext('2d', { willReadFrequently: true });
  context?.drawImage(bitmap, 0, 0);
  bitmap.close();
  const image = context?.getImageData(0, 0, canvas.width, canvas.height);
  if (!image) throw new ApiFailure(0, 'failed', 'This browser cannot show the picture.');
  return { name, blob, pixels: { width: image.width, height: image.height, data: image.data } };
}
