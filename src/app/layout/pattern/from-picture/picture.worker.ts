/** Lays pictures beside the page, so that no touch of the dialog waits for 28 800 tiles. */
import { picturePattern, type PatternWish } from './picture-pattern';
import type { PicturePixels } from './tile-colours';

export type WorkerRequest =
  | { readonly kind: 'picture'; readonly pixels: PicturePixels }
  | { readonly kind: 'wish'; readonly wish: PatternWish };

export interface WorkerAnswer {
  readonly pattern: Uint8Array<ArrayBuffer>;
}

let pixels: PicturePixels | null = null;

addEventListener('message', ({ data }: MessageEvent<WorkerRequest>) => {
  if (data.kind === 'picture') {
    pixels = data.pixels;
  } else if (pixels) {
    const answer: WorkerAnswer = { pattern: Uint8Array.from(picturePattern(pixels, data.wish)) };
    postMessage(answer, { transfer: [answer.pattern.buffer] });
  }
});
