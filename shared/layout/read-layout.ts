/** Layout files in and out: text or parsed JSON to a layout that holds together, and back to the same text. */
import type * as z from 'zod';
import { decodeCells, encodeCells } from './cells';
import { problemsOf } from './consistency';
import { migrateLayout } from './migrations';
import {
  LAYOUT_FORMAT,
  LAYOUT_FORMAT_VERSION,
  layoutFileSchema,
  type Layout,
  type LayoutFile,
  type Problem,
} from './schema';

/** A layout, or everything that is wrong with the document, field by field. */
export type LayoutReading =
  | { readonly ok: true; readonly layout: Layout }
  | { readonly ok: false; readonly problems: readonly Problem[] };

/** Longest layout file that is looked at, in characters: over twice the largest layout with long names. */
export const LAYOUT_TEXT_MOST = 262_144;

/** Reads the text of a layout file. */
export function readLayoutText(text: string): LayoutReading {
  if (text.length > LAYOUT_TEXT_MOST) {
    return refused(
      'file',
      `must be at most ${LAYOUT_TEXT_MOST / 1024} KiB; the largest layout needs far less`,
    );
  }
  let value: unknown;
  try {
    value = JSON.parse(text.replace(/^\uFEFF/, ''));
  } catch {
    return refused('file', 'is not JSON, so it is not a layout file');
  }
  return readLayout(value);
}

/** Reads a parsed layout file. */
export function readLayout(value: unknown): LayoutReading {
  if (typeof value !== 'object' || value === null || Array.isArray(value)) {
    return refused('file', 'must be a JSON object, the layout document');
  }
  const document = value as Record<string, unknown>;
  if (document['format'] !== LAYOUT_FORMAT) {
    return refused('format', `must be "${LAYOUT_FORMAT}"; this is not a layout file`);
  }
  const version = document['formatVersion'];
  if (typeof version !== 'number' || !Number.isInteger(version) || version < 1) {
    return refused('formatVersion', `must be a whole number from 1 to ${LAYOUT_FORMAT_VERSION}`);
  }
  if (version > LAYOUT_FORMAT_VERSION) {
    return refused(
      'formatVersion',
      `is ${version}: this file was written by a newer Staveloom; this one reads up to version ${LAYOUT_FORMAT_VERSION}`,
    );
  }
  const parsed = layoutFileSchema.safeParse(migrateLayout(document, version));
  if (!parsed.success) return { ok: false, problems: parsed.error.issues.flatMap(problemsOfIssue) };
  return layoutOf(parsed.data);
}

function layoutOf({
  format: _,
  formatVersion: __,
  cells: text,
  ...rest
}: LayoutFile): LayoutReading {
  const cells = decodeCells(text);
  if (!cells) return refused('cells', 'must be base64 text (RFC 4648, with padding)');
  const layout: Layout = { ...rest, cells };
  const problems = problemsOf(layout);
  return problems.length > 0 ? { ok: false, problems } : { ok: true, layout };
}

function refused(field: string, message: string): LayoutReading {
  return { ok: false, problems: [{ field, message }] };
}

/** A schema's complaint in our words: unknown keys by name, one problem each. */
export function problemsOfIssue(issue: z.core.$ZodIssue): Problem[] {
  const path = issue.path.map(String);
  if (issue.code === 'unrecognized_keys') {
    return issue.keys.map((key) => ({
      field: [...path, printableKey(key)].join('.'),
      message: 'is not a known key here',
    }));
  }
  const field = path.join('.') || 'file';
  if (issue.code === 'invalid_type' && issue.expected === 'object') {
    return [{ field, message: 'must be there, as an object' }];
  }
  return [{ field, message: issue.message }];
}

/** Keys come from strangers' files and are repeated in messages: shortened, and without control characters. */
function printableKey(key: string): string {
  const clean = key.replace(/[^\p{L}\p{N}\p{P}\p{S} ]/gu, '?');
  return clean.length > 60 ? `${clean.slice(0, 60)}…` : clean;
}

/** The layout as it travels in a file. */
export function layoutFileOf(layout: Layout): LayoutFile {
  return {
    format: LAYOUT_FORMAT,
    formatVersion: LAYOUT_FORMAT_VERSION,
    name: layout.name,
    lengthUnit: layout.lengthUnit,
    shell: layout.shell,
    joint: layout.joint,
    cutter: layout.cutter,
    build: layout.build,
    woods: [...layout.woods],
    cells: encodeCells(layout.cells),
  };
}

/** The text of a layout's file: the same layout gives the same text, keys in the order of the schema. */
export function printLayout(layout: Layout): string {
  return `${JSON.stringify(layoutFileSchema.parse(layoutFileOf(layout)), null, 2)}\n`;
}
