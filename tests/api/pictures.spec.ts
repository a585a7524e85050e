/** Pictures to be laid as tiles: what comes back of a good one, and the sentence for each bad one. */
import { PICTURE_BOUNDS } from '@shared/api/picture';
import sharp, { type Sharp } from 'sharp';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { Browser, signedIn, type Answer } from './browser';
import { problem } from './demonstration';
import { animatedPng, animatedWebp, halves, noise, paddedPng, plainPng } from './picture-files';
import { runningApp, type RunningApp } from './running-app';

const PATH = '/pictures/prepared';

let running: RunningApp;
let designer: Browser;
beforeAll(async () => {
  running = await runningApp();
  designer = await signedIn(running.app, 'designer');
});
afterAll(() => running.close());

function send(bytes: Buffer, browser = designer, fileName = 'picture.png'): Promise<Answer> {
  return browser.upload(PATH, { field: 'picture', bytes, fileName });
}

/** The picture that came back, as pixels. */
async function prepared(bytes: Buffer) {
  const answer = await send(bytes);
  expect([answer.status, answer.headers['content-type']]).toEqual([200, 'image/png']);
  const metadata = await sharp(answer.bytes).metadata();
  const { data, info } = await sharp(answer.bytes).raw().toBuffer({ resolveWithObject: true });
  const at = (x: number, y: number): number[] => {
    const from = (y * info.width + x) * info.channels;
    return [...data.subarray(from, from + info.channels)];
  };
  return { metadata, at, width: info.width, height: info.height };
}

describe('a picture that is sent', () => {
  it.each(['png', 'jpeg', 'webp'] as const)('comes back as PNG when it is %s', async (format) => {
    const { width, height } = await prepared(await noise(300, 200).toFormat(format).toBuffer());
    expect([width, height]).toEqual([300, 200]);
  });

  it('comes back at most 1024 px a side', async () => {
    const { width, height } = await prepared(await noise(3000, 1500).jpeg().toBuffer());
    expect([width, height]).toEqual([1024, 512]);
  });

  it('comes back upright as its EXIF orientation says', async () => {
    // 6: the first row is the right side; red at the left lands at the top
    const lying = await halves(80, 40).withMetadata({ orientation: 6 }).jpeg().toBuffer();
    const { width, height, at } = await prepared(lying);
    expect([width, height]).toEqual([40, 80]);
    expect(at(20, 10)[0]).toBeGreaterThan(200);
    expect(at(20, 70)[2]).toBeGreaterThan(200);
  });

  it('comes back without metadata', async () => {
    const exif = { IFD0: { Copyright: 'Harriet Vale', Make: 'Camera' } };
    const told = await noise(60, 60)
      .withExif(exif)
      .withIccProfile('p3')
      .withXmp('<x:xmpmeta xmlns:x="adobe:ns:meta/"/>')
      .jpeg()
      .toBuffer();
    expect((await sharp(told).metadata()).exif).toBeDefined();
    const { metadata } = await prepared(told);
    expect(metadata).not.toHaveProperty('exif');
    expect(metadata).not.toHaveProperty('icc');
    expect(metadata).not.toHaveProperty('xmp');
    expect(metadata).not.toHaveProperty('comments');
  });

  it('shows paper where it was transparent', async () => {
    const clear = { r: 0, g: 0, b: 0, alpha: 0 };
    const png = sharp({ create: { width: 30, height: 30, channels: 4, background: clear } }).png();
    const { at, metadata } = await prepared(await png.toBuffer());
    expect(at(15, 15)).toEqual([0xf4, 0xf1, 0xea]);
    expect(metadata.hasAlpha).toBe(false);
  });

  it('is made smaller in linear light: fine black and white becomes the grey the eye sees', async () => {
    const side = 2048;
    const pixels = Buffer.alloc(side * side);
    for (let i = 0; i < pixels.length; i++) pixels[i] = ((i + Math.floor(i / side)) % 2) * 255;
    const raw = { width: side, height: side, channels: 1 } as const;
    const { at } = await prepared(await sharp(pixels, { raw }).png().toBuffer());
    // half the light is 188 of 255 in sRGB
    expect(at(500, 500)).toEqual([188, 188, 188]);
  });

  const colourways: [string, () => Sharp][] = [
    ['of 16 bit', () => halves(80, 40).toColourspace('rgb16').png()],
    ['with a profile of sRGB', () => halves(80, 40).withIccProfile('srgb').jpeg()],
    ['with a profile of wider colours', () => halves(80, 40).withIccProfile('p3').png()],
    ['of four inks', () => halves(80, 40).toColourspace('cmyk').jpeg()],
    ['of four inks with their profile', () => halves(80, 40).withIccProfile('cmyk').jpeg()],
    ['larger, with a profile', () => halves(2400, 1200).withIccProfile('p3').jpeg()],
  ];
  it.each(colourways)('may be %s, and comes back in sRGB', async (_, made) => {
    const { metadata, at, width, height } = await prepared(await made().toBuffer());
    expect([metadata.space, metadata.channels, metadata.depth]).toEqual(['srgb', 3, 'uchar']);
    const [red, blue] = [at(5, height - 5), at(width - 5, 5)];
    expect(red[0]).toBeGreaterThan(180);
    expect(red[2]).toBeLessThan(80);
    expect(blue[2]).toBeGreaterThan(120);
    expect(blue[0]).toBeLessThan(80);
  });

  it('may be grey, and comes back in red, green and blue', async () => {
    const grey = { create: { width: 9, height: 9, channels: 3, background: '#777777' } } as const;
    for (const space of ['b-w', 'grey16'] as const) {
      const { at } = await prepared(await sharp(grey).toColourspace(space).png().toBuffer());
      expect(at(4, 4)).toEqual([0x77, 0x77, 0x77]);
    }
  });

  it('may have exactly 10 MB', async () => {
    const png = await halves(40, 40).png().toBuffer();
    expect((await send(paddedPng(png, PICTURE_BOUNDS.bytes))).status).toBe(200);
  });

  it('may have exactly 40 megapixels', async () => {
    const { width, height } = await prepared(plainPng(8000, 5000));
    expect([width, height]).toEqual([1024, 640]);
  });
});

describe('a picture that is not taken', () => {
  const svg = Buffer.from(
    '<?xml version="1.0"?><svg xmlns="http://www.w3.org/2000/svg" width="9" height="9"/>',
  );

  const bad: [string, () => Buffer | Promise<Buffer>, RegExp][] = [
    ['an SVG under the name of a PNG', () => svg, /PNG, JPEG or WebP file; this is an SVG drawing/],
    ['a GIF', () => noise(9, 9).gif().toBuffer(), /this is a GIF picture/],
    ['a TIFF', () => noise(9, 9).tiff().toBuffer(), /this is a TIFF picture/],
    ['an AVIF', () => noise(64, 64).avif({ effort: 0 }).toBuffer(), /this is an AVIF picture/],
    ['a PDF', () => Buffer.from('%PDF-1.7\n'), /this is a PDF document/],
    ['text', () => Buffer.from('Good morning.'), /this is something else/],
    ['nothing', () => Buffer.alloc(0), /this is an empty file/],
    ['an animated WebP', animatedWebp, /must stand still; this one is animated/],
    ['an animated PNG', animatedPng, /must stand still; this one is animated/],
    ['41 megapixels', () => plainPng(8200, 5000), /at most 40 megapixels; this one has 41\.0/],
    [
      'a bomb: 400 megapixels in a small file',
      () => plainPng(20_000, 20_000),
      /has 400\.0 \(20000 × 20000\)/,
    ],
  ];
  it.each(bad)('%s', async (_, bytes, sentence) => {
    const { code, message, fields } = problem(await send(await bytes()), 400);
    expect(code).toBe('bad-input');
    expect(message).toMatch(sentence);
    expect(fields?.map(({ field }) => field)).toEqual(['picture']);
  });

  it.each(['png', 'jpeg', 'webp'] as const)('a %s cut short', async (format) => {
    const whole = await noise(300, 200).toFormat(format).toBuffer();
    for (const share of [0.02, 0.5, 0.98]) {
      const cut = whole.subarray(0, Math.floor(whole.length * share));
      expect(problem(await send(cut), 400).message).toMatch(/cut short or damaged/);
    }
  });

  it('a head without a picture', async () => {
    const png = (await halves(40, 40).png().toBuffer()).subarray(0, 33);
    expect(problem(await send(Buffer.concat([png, Buffer.alloc(500)])), 400).message).toMatch(
      /cut short or damaged/,
    );
  });

  it('10 MB and a byte', async () => {
    const png = paddedPng(await halves(40, 40).png().toBuffer(), PICTURE_BOUNDS.bytes + 1);
    const { code, message } = problem(await send(png), 413);
    expect(code).toBe('too-large');
    expect(message).toBe('The picture must be at most 10 MB; this one is larger. Save it smaller.');
  });
});

describe('the body', () => {
  it('must hold one file, under the name "picture"', async () => {
    const bytes = await halves(9, 9).png().toBuffer();
    const elsewhere = { field: 'photo', bytes, fileName: 'a.png' };
    const first = { field: 'picture', bytes, fileName: 'a.png' };
    for (const files of [[elsewhere], [first, first], [first, elsewhere]]) {
      const { message } = problem(await designer.upload(PATH, ...files), 400);
      expect(message).toMatch(/^picture must be/);
    }
  });

  it('must be whole', async () => {
    const headers = { 'Content-Type': 'multipart/form-data; boundary=seam' };
    const answer = designer.send('post', PATH, '--seam\r\nContent-Disp', headers);
    expect(problem(await answer, 400).code).toBe('bad-input');
  });
});

describe('who may send one', () => {
  it('not a maker, a client or a stranger', async () => {
    const bytes = await halves(9, 9).png().toBuffer();
    for (const somebody of ['maker', 'client'] as const) {
      const answer = await send(bytes, await signedIn(running.app, somebody));
      expect(problem(answer, 403).code).toBe('not-allowed');
    }
    const stranger = new Browser(running.app);
    await stranger.get('/session');
    expect(problem(await send(bytes, stranger), 401).code).toBe('not-signed-in');
  });

  it('not another site through a browser that is signed in', async () => {
    const owner = await signedIn(running.app, 'owner');
    owner.cookies.delete('XSRF-TOKEN');
    const answer = await send(await halves(9, 9).png().toBuffer(), owner);
    expect(problem(answer, 403).code).toBe('forged-request');
  });

  it('not one person with more than two at once; the others are told to wait', async () => {
    const bytes = await noise(2500, 2500).jpeg().toBuffer();
    const answers = await Promise.all([1, 2, 3, 4, 5].map(() => send(bytes)));
    const statuses = answers.map(({ status }) => status);
    expect(statuses.filter((status) => status === 200)).toHaveLength(2);
    const refused = answers.find(({ status }) => status === 429)!;
    expect(problem(refused, 429).message).toMatch(/Wait a few seconds/);
    expect((await send(bytes)).status).toBe(200);
  });
});
