/** What a file is, by its first bytes; its name and the type a browser gives it say nothing. */
import type { PictureType } from '@shared/api/picture';

export type PictureKind =
  | { readonly kind: 'taken'; readonly type: PictureType }
  /** `what` with its article: "an SVG drawing". */
  | { readonly kind: 'refused'; readonly what: string };

const PNG = [0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a];
const JPEG = [0xff, 0xd8, 0xff];

/** The kind of a file. */
export function pictureKindOf(bytes: Uint8Array): PictureKind {
  if (startsWith(bytes, PNG)) return { kind: 'taken', type: 'image/png' };
  if (startsWith(bytes, JPEG)) return { kind: 'taken', type: 'image/jpeg' };
  if (textAt(bytes, 0, 4) === 'RIFF' && textAt(bytes, 8, 4) === 'WEBP') {
    return { kind: 'taken', type: 'image/webp' };
  }
  return { kind: 'refused', what: otherKind(bytes) };
}

/** Others that a person may well try, by name, so that the refusal says more than "no". */
function otherKind(bytes: Uint8Array): string {
  if (bytes.length === 0) return 'an empty file';
  const start = textAt(bytes, 0, 4);
  if (start === 'GIF8') return 'a GIF picture';
  if (start === 'II*\0' || start === 'MM\0*') return 'a TIFF picture';
  if (start === '%PDF') return 'a PDF document';
  if (start.startsWith('BM')) return 'a BMP picture';
  if (textAt(bytes, 4, 4) === 'ftyp') {
    return textAt(bytes, 8, 3) === 'avi' ? 'an AVIF picture' : 'a HEIC picture or a film';
  }
  return isMarkup(bytes) ? 'an SVG drawing' : 'something else';
}

/** An SVG drawing may begin with a byte order mark, a declaration, comments and a document type. */
function isMarkup(bytes: Uint8Array): boolean {
  const text = new TextDecoder().decode(bytes.subarray(0, 4096)).trimStart();
  return text.startsWith('<') && text.includes('<svg');
}

function startsWith(bytes: Uint8Array, start: readonly number[]): boolean {
  return start.every((byte, i) => bytes[i] === byte);
}

function textAt(bytes: Uint8Array, at: number, length: number): string {
  return String.fromCharCode(...bytes.subarray(at, at + length));
}

/** True when a PNG announces an animation (APNG): an acTL chunk before its pixels. */
export function isAnimatedPng(bytes: Uint8Array): boolean {
  const view = new DataView(bytes.buffer, bytes.byteOffset, bytes.byteLength);
  for (let at = PNG.length; at + 8 <= bytes.length;) {
    const name = textAt(bytes, at + 4, 4);
    if (name === 'acTL') return true;
    if (name === 'IDAT') return false;
    at += 12 + view.getUint32(at);
  }
  return false;
}
