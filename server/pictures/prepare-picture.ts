/**
 * A picture made ready to be cropped and laid as tiles in the browser. It is decoded here, because only the
 * server can refuse what would fill a browser's memory, and because what comes back holds no metadata: no
 * place, no camera, no name. It is averaged to tiles in the browser, which has to do that again at every
 * touch of the crop.
 */
import { PAPER_COLOUR, PICTURE_BOUNDS, PREPARED_SIDE_PX } from '@shared/api/picture';
import sharp, { type Metadata, type Sharp } from 'sharp';
import { isAnimatedPng, pictureKindOf } from './picture-kind';

export type PreparedPicture =
  | { readonly ok: true; readonly png: Uint8Array }
  /** Why it is not taken, to stand behind "The picture"; what the decoder said is for the log. */
  | { readonly ok: false; readonly refusal: string; readonly cause?: unknown };

/** A picture that takes longer to decode than this is made to hold the server up. */
const SECONDS_MOST = 10;

/**
 * A PNG of the first and only frame: upright, in sRGB, on paper where it was transparent, at most
 * `PREPARED_SIDE_PX` a side. Makes it smaller in linear light, so that fine black and white does not darken.
 */
export async function preparePicture(bytes: Uint8Array): Promise<PreparedPicture> {
  const found = pictureKindOf(bytes);
  if (found.kind === 'refused') {
    return refused(`must be a PNG, JPEG or WebP file; this is ${found.what}`);
  }
  if (found.type === 'image/png' && isAnimatedPng(bytes)) return refused(MOVING);
  const head = await headOf(bytes);
  if (!head) return refused(BROKEN);
  if ((head.pages ?? 1) > 1) return refused(MOVING);
  const pixels = head.width * head.height;
  if (pixels > PICTURE_BOUNDS.pixels) return refused(tooManyPixels(head.width, head.height));
  try {
    return { ok: true, png: await decode(bytes, head) };
  } catch (error) {
    const late = error instanceof Error && error.message.startsWith('timeout');
    return { ok: false, refusal: late ? TOO_SLOW : BROKEN, cause: error };
  }
}

const MOVING = 'must stand still; this one is animated. Save one of its frames and take that';
const BROKEN = 'cannot be read: the file is cut short or damaged. Save or copy it again';
const TOO_SLOW = `takes longer than ${SECONDS_MOST} s to read. Save it smaller, or as another kind of file`;

function tooManyPixels(width: number, height: number): string {
  const most = PICTURE_BOUNDS.pixels / 1e6;
  const megapixels = Math.ceil((width * height) / 1e5) / 10;
  return (
    `must have at most ${most} megapixels; this one has ${megapixels.toFixed(1)} ` +
    `(${width} × ${height}). Save it smaller`
  );
}

function refused(refusal: string): PreparedPicture {
  return { ok: false, refusal };
}

/** Size and frames, from the head of the file; null when even that cannot be read. */
async function headOf(bytes: Uint8Array): Promise<Metadata | null> {
  try {
    return await sharp(bytes, { limitInputPixels: false }).metadata();
  } catch {
    return null;
  }
}

/**
 * Decoded, upright and small, with its colour profile; then in sRGB and on paper. Between the two stands a
 * TIFF, because libpng refuses to write some of the profiles that cameras embed.
 */
async function decode(bytes: Uint8Array, head: Metadata): Promise<Uint8Array> {
  const input = { limitInputPixels: PICTURE_BOUNDS.pixels, failOn: 'error' } as const;
  const side = { width: PREPARED_SIDE_PX, height: PREPARED_SIDE_PX };
  const upright = sharp(bytes, input).timeout({ seconds: SECONDS_MOST }).autoOrient();
  const small = await (shrinksInLinearLight(head) ? inLinearLight(upright) : upright)
    .resize({ ...side, fit: 'inside', withoutEnlargement: true })
    .toColourspace('srgb')
    .tiff({ compression: 'none' })
    .toBuffer();
  return sharp(small).flatten({ background: PAPER_COLOUR }).png().toBuffer();
}

/** Inks, and greys with a profile of their own, are turned to sRGB first and made smaller as they are. */
function shrinksInLinearLight({ space, hasProfile }: Metadata): boolean {
  return space !== 'cmyk' && (!hasProfile || space === 'srgb' || space === 'rgb16');
}

/**
 * Neither the profile nor the paper can be applied here: sharp would take figures of light for figures of
 * sRGB. Profiles in use have a curve close to that of sRGB or the same, so the light is right without.
 */
function inLinearLight(picture: Sharp): Sharp {
  return picture.keepIccProfile().pipelineColourspace('scrgb');
}
