/**
 * The layout document. One zod schema checks files, request bodies and stored rows. What a single field
 * may hold is said here; what fields owe each other (cells to size, joints that close) is in consistency.ts.
 */
import * as z from 'zod';

/** Bounds of the document, inclusive; lengths in millimetres, angles in degrees. */
export const BOUNDS = {
  staves: { least: 6, most: 240 },
  courses: { least: 1, most: 120 },
  tile: { least: 6, most: 300 },
  diameter: { least: 10, most: 30_000 },
  height: { least: 1, most: 36_000 },
  board: { least: 1, most: 150 },
  skimAllowance: { least: 0, most: 10 },
  clearance: { least: 0, most: 2 },
  radius: { least: 0, most: 150 },
  headRadius: { least: 0.2, most: 150 },
  reach: { least: 0.2, most: 150 },
  rootWidth: { least: 0.5, most: 300 },
  flankAngle: { least: 0, most: 45 },
  cutterDiameter: { least: 0.5, most: 25 },
  fluteLength: { least: 0.5, most: 150 },
  spareShare: { least: 0, most: 1 },
  spareMinimum: { least: 0, most: 100 },
  woods: { least: 1, most: 24 },
  nameLength: { least: 1, most: 120 },
  woodKeyLength: { least: 1, most: 40 },
} as const;

interface Bound {
  readonly least: number;
  readonly most: number;
}

function numberWithin(bound: Bound, unit: string) {
  const range = `must be a number from ${bound.least} to ${bound.most}${unit}`;
  return z.number({ error: range }).min(bound.least, range).max(bound.most, range);
}

function wholeNumberWithin(bound: Bound) {
  const range = `must be a whole number from ${bound.least} to ${bound.most}`;
  return z.number({ error: range }).int(range).min(bound.least, range).max(bound.most, range);
}

/** A length in millimetres within the bound. */
const length = (bound: Bound) => numberWithin(bound, ' mm');

/** What no text of ours may hold: control characters, line separators, lone surrogates. */
export const CONTROL_CHARACTER =
  /[\u0000-\u001f\u007f-\u009f\u2028\u2029\ud800-\udfff\ufffe\uffff]/u;

/** One line of text as people name things: no control characters, not only spaces, at most `most` characters. */
export function lineOfText(most: number) {
  return z
    .string({ error: 'must be text' })
    .min(1, 'must not be empty')
    .max(most, `must be at most ${most} characters long`)
    .refine((text) => !CONTROL_CHARACTER.test(text), 'must not contain control characters')
    .refine((text) => text.trim() !== '', 'must not be only spaces');
}

function choice<const T extends readonly string[]>(values: T) {
  return z.enum(values, { error: `must be one of ${values.map((v) => `"${v}"`).join(', ')}` });
}

export const shellSchema = z.strictObject({
  staves: wholeNumberWithin(BOUNDS.staves),
  courses: wholeNumberWithin(BOUNDS.courses),
  tileWidth: length(BOUNDS.tile),
  tileHeight: length(BOUNDS.tile),
  finishedOuterDiameter: length(BOUNDS.diameter),
  finishedInnerDiameter: length(BOUNDS.diameter),
  finishedHeight: length(BOUNDS.height),
  boardThickness: length(BOUNDS.board),
  skimAllowance: length(BOUNDS.skimAllowance),
});

export const jointParametersSchema = z.discriminatedUnion(
  'profile',
  [
    z.strictObject({
      profile: z.literal('round'),
      headRadius: length(BOUNDS.headRadius),
      filletRadius: length(BOUNDS.radius),
      reach: length(BOUNDS.reach),
    }),
    z.strictObject({
      profile: z.literal('dovetail'),
      rootWidth: length(BOUNDS.rootWidth),
      flankAngle: numberWithin(BOUNDS.flankAngle, '°'),
      reach: length(BOUNDS.reach),
      tipRadius: length(BOUNDS.radius),
      rootRadius: length(BOUNDS.radius),
    }),
  ],
  { error: 'must be a "round" or a "dovetail" profile' },
);

export const jointSchema = z.strictObject({
  scheme: choice(['alternating', 'one-way']),
  clearance: length(BOUNDS.clearance),
  staveJoint: jointParametersSchema,
  courseJoint: jointParametersSchema,
});

export const cutterSchema = z.strictObject({
  diameter: length(BOUNDS.cutterDiameter),
  fluteLength: length(BOUNDS.fluteLength),
});

export const buildSchema = z.strictObject({
  way: choice(['stave-by-stave', 'tile-by-tile']).default('stave-by-stave'),
  turnOver: z.boolean({ error: 'must be true or false' }).default(true),
  spareShare: numberWithin(BOUNDS.spareShare, '').default(0.1),
  spareMinimum: wholeNumberWithin(BOUNDS.spareMinimum).default(1),
});

export const woodSchema = z.strictObject({
  key: z
    .string({ error: 'must be text' })
    .regex(
      /^[A-Za-z0-9][A-Za-z0-9_-]{0,39}$/,
      'must be 1 to 40 letters, digits, "-" or "_", starting with a letter or digit',
    ),
  name: lineOfText(BOUNDS.nameLength.most),
  colour: z
    .string({ error: 'must be a colour such as "#DCC39A"' })
    .regex(/^#[0-9A-Fa-f]{6}$/, 'must be a colour such as "#DCC39A"'),
  species: lineOfText(BOUNDS.nameLength.most).optional(),
  sawn: choice(['flat', 'rift', 'quarter']).default('flat'),
});

const woodsRange = `must list ${BOUNDS.woods.least} to ${BOUNDS.woods.most} woods`;

export const woodsSchema = z
  .array(woodSchema, { error: woodsRange })
  .min(BOUNDS.woods.least, woodsRange)
  .max(BOUNDS.woods.most, woodsRange);

/** Longest base64 text that cells of the greatest layout need. */
const CELLS_TEXT_MOST = Math.ceil((BOUNDS.staves.most * BOUNDS.courses.most) / 3) * 4;

export const LAYOUT_FORMAT = 'staveloom-layout';
export const LAYOUT_FORMAT_VERSION = 1;

/** The layout as it travels in a file, cells as base64. */
export const layoutFileSchema = z.strictObject({
  format: z.literal(LAYOUT_FORMAT, { error: `must be "${LAYOUT_FORMAT}"` }),
  formatVersion: z.literal(LAYOUT_FORMAT_VERSION, { error: `must be ${LAYOUT_FORMAT_VERSION}` }),
  name: lineOfText(BOUNDS.nameLength.most),
  lengthUnit: choice(['mm', 'in']),
  shell: shellSchema,
  joint: jointSchema,
  cutter: cutterSchema,
  build: buildSchema.prefault({}),
  woods: woodsSchema,
  cells: z
    .string({ error: 'must be base64 text' })
    .max(CELLS_TEXT_MOST, `must be at most ${CELLS_TEXT_MOST} characters of base64`),
});

export type Shell = z.infer<typeof shellSchema>;
export type Joint = z.infer<typeof jointSchema>;
export type Cutter = z.infer<typeof cutterSchema>;
export type Build = z.infer<typeof buildSchema>;
export type Wood = z.infer<typeof woodSchema>;
export type LayoutFile = z.infer<typeof layoutFileSchema>;

/** The layout as the program works on it: the file without its head, cells as bytes. */
export interface Layout {
  readonly name: string;
  readonly lengthUnit: 'mm' | 'in';
  readonly shell: Shell;
  readonly joint: Joint;
  readonly cutter: Cutter;
  readonly build: Build;
  readonly woods: readonly Wood[];
  readonly cells: Uint8Array;
}

/** One thing wrong with a document: where ("joint.staveJoint.reach") and a sentence about it. */
export interface Problem {
  readonly field: string;
  readonly message: string;
}
