/** Pictures, whole and spoilt, made where they are used. */
import { deflateSync } from 'node:zlib';
import sharp from 'sharp';

/** A picture of noise, so that no file gets small by being plain. */
export function noise(width: number, height: number) {
  const gaussian = { type: 'gaussian', mean: 128, sigma: 40 } as const;
  return sharp({ create: { width, height, channels: 3, background: '#808080', noise: gaussian } });
}

/** Left half red, right half blue. */
export function halves(width: number, height: number) {
  const pixels = Buffer.alloc(width * height * 3);
  for (let i = 0; i < width * height; i++) pixels[3 * i + (i % width < width / 2 ? 0 : 2)] = 255;
  return sharp(pixels, { raw: { width, height, channels: 3 } });
}

/** Two frames of WebP. */
export function animatedWebp(): Promise<Buffer> {
  const frames = Buffer.alloc(20 * 20 * 3 * 2);
  frames.fill(255, 0, 20 * 20 * 3);
  return sharp(frames, { raw: { width: 20, height: 40, channels: 3, pageHeight: 20 } })
    .webp({ loop: 0, delay: [100, 100] })
    .toBuffer();
}

/** A PNG that says it is animated: an acTL chunk after its header. */
export async function animatedPng(): Promise<Buffer> {
  const still = await halves(20, 20).png().toBuffer();
  const control = Buffer.from([0, 0, 0, 2, 0, 0, 0, 0]);
  return Buffer.concat([still.subarray(0, 33), chunk('acTL', control), still.subarray(33)]);
}

/** A PNG of one colour; `deflateSync` packs a thousand to one, so the file stays small. */
export function plainPng(width: number, height: number): Buffer {
  const header = Buffer.alloc(13);
  header.writeUInt32BE(width, 0);
  header.writeUInt32BE(height, 4);
  header.set([1, 0, 0, 0, 0], 8);
  const rows = deflateSync(Buffer.alloc((Math.ceil(width / 8) + 1) * height));
  const signature = Buffer.from([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a]);
  return Buffer.concat([
    signature,
    chunk('IHDR', header),
    chunk('IDAT', rows),
    chunk('IEND', Buffer.alloc(0)),
  ]);
}

/** The same PNG made up to a size with a chunk that readers skip. */
export function paddedPng(png: Buffer, bytes: number): Buffer {
  const end = png.length - 12;
  const padding = chunk('paDd', Buffer.alloc(bytes - png.length - 12));
  return Buffer.concat([png.subarray(0, end), padding, png.subarray(end)]);
}

function chunk(name: string, data: Buffer): Buffer {
  const named = Buffer.concat([Buffer.from(name, 'latin1'), data]);
  const framed = Buffer.alloc(named.length + 8);
  framed.writeUInt32BE(data.length, 0);
  named.copy(framed, 4);
  framed.writeUInt32BE(crc32(named), named.length + 4);
  return framed;
}

/** CRC of ISO 3309, as PNG wants it (PNG specification, annex D). */
function crc32(bytes: Buffer): number {
  let crc = 0xffffffff;
  for (const byte of bytes) {
    crc ^= byte;
    for (let bit = 0; bit < 8; bit++) crc = crc & 1 ? (crc >>> 1) ^ 0xedb88320 : crc >>> 1;
  }
  return (crc ^ 0xffffffff) >>> 0;
}
