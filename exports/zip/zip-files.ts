import { strToU8, zipSync, type Zippable } from 'fflate';

/** A file of the bundle: its path with "/" between folders, and its text. */
export interface BundleFile {
  readonly path: string;
  readonly text: string;
}

/**
 * ZIP keeps local time without a zone, and fflate takes it from the local clock: a date made from local
 * parts gives the same bytes everywhere. The earliest year ZIP knows, at noon so that no change of the
 * clocks can move the day.
 */
const FIXED_TIME = new Date(1980, 0, 1, 12);

/** The files as one ZIP, in the given order: the same files always give the same bytes. */
export function zipFiles(files: readonly BundleFile[]): Uint8Array {
  const entries: Zippable = {};
  for (const { path, text } of files) entries[path] = strToU8(text);
  return zipSync(entries, { level: 6, mtime: FIXED_TIME });
}
