import { strFromU8, unzipSync } from 'fflate';
import { describe, expect, it, vi } from 'vitest';
import { zipFiles, type BundleFile } from './zip-files';

const files: BundleFile[] = [
  { path: 'manifest.json', text: '{}\n' },
  { path: 'outlines/01-ash.svg', text: '<svg/>\n' },
];

describe('the ZIP of a bundle', () => {
  it('holds every file as it was', () => {
    const read = unzipSync(zipFiles(files));
    expect(Object.keys(read)).toEqual(files.map((file) => file.path));
    expect(files.map(({ path }) => strFromU8(read[path] ?? new Uint8Array()))).toEqual(
      files.map((file) => file.text),
    );
  });

  it('is the same bytes every time, whatever the clock says', () => {
    vi.useFakeTimers({ now: new Date(2027, 2, 14, 9, 26) });
    const first = zipFiles(files);
    vi.setSystemTime(new Date(2031, 11, 31, 23, 59));
    expect(zipFiles(files)).toEqual(first);
    vi.useRealTimers();
  });
});
