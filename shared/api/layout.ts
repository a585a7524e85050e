import * as z from 'zod';
import {
  BOUNDS,
  buildSchema,
  cutterSchema,
  jointSchema,
  layoutFileSchema,
  lineOfText,
  shellSchema,
  woodsSchema,
} from '../layout/schema';

const TILES_MOST = BOUNDS.staves.most * BOUNDS.courses.most;
const positionsSchema = z
  .array(
    z
      .int()
      .min(0)
      .max(TILES_MOST - 1),
  )
  .min(1)
  .max(TILES_MOST);
const woodIndexesSchema = z
  .array(
    z
      .int()
      .min(0)
      .max(BOUNDS.woods.most - 1),
  )
  .min(1)
  .max(TILES_MOST);

function field<const P extends string, T extends z.ZodType>(path: P, value: T) {
  return z.strictObject({
    kind: z.literal('field'),
    path: z.literal(path),
    before: value,
    after: value,
  });
}

const fieldChangeSchema = z.discriminatedUnion('path', [
  field('name', lineOfText(BOUNDS.nameLength.most)),
  field('lengthUnit', layoutFileSchema.shape.lengthUnit),
  field('shell.tileWidth', shellSchema.shape.tileWidth),
  field('shell.tileHeight', shellSchema.shape.tileHeight),
  field('shell.finishedOuterDiameter', shellSchema.shape.finishedOuterDiameter),
  field('shell.finishedInnerDiameter', shellSchema.shape.finishedInnerDiameter),
  field('shell.finishedHeight', shellSchema.shape.finishedHeight),
  field('shell.boardThickness', shellSchema.shape.boardThickness),
  field('shell.skimAllowance', shellSchema.shape.skimAllowance),
  field('joint.scheme', jointSchema.shape.scheme),
  field('joint.clearance', jointSchema.shape.clearance),
  field('joint.staveJoint', jointSchema.shape.staveJoint),
  field('joint.courseJoint', jointSchema.shape.courseJoint),
  field('cutter.diameter', cutterSchema.shape.diameter),
  field('cutter.fluteLength', cutterSchema.shape.fluteLength),
  field('build.way', buildSchema.shape.way.unwrap()),
  field('build.turnOver', buildSchema.shape.turnOver.unwrap()),
  field('build.spareShare', buildSchema.shape.spareShare.unwrap()),
  field('build.spareMinimum', buildSchema.shape.spareMinimum.unwrap()),
  field('woods', woodsSchema),
]);

const gridStateSchema = z.strictObject({
  staves: shellSchema.shape.staves,
  courses: shellSchema.shape.courses,
  /** base64, as in the layout file */
  cells: layoutFileSchema.shape.cells,
});

/** Changes as they travel: like shared/layout/patch.ts, with cells as base64. */
export const changeSchema = z.discriminatedUnion('kind', [
  z.strictObject({
    kind: z.literal('cells'),
    positions: positionsSchema,
    before: woodIndexesSchema,
    after: woodIndexesSchema,
  }),
  fieldChangeSchema,
  z.strictObject({ kind: z.literal('resize'), before: gridStateSchema, after: gridStateSchema }),
]);

export const patchSchema = z.array(changeSchema).min(1).max(200);
export type WirePatch = z.infer<typeof patchSchema>;

/** One save: the edit, the revision it was made on, and a key that makes repeating it harmless. */
export const editSchema = z.strictObject({
  baseRevision: z.int({ error: 'must be a whole number' }).min(0),
  idempotencyKey: z.uuid({ error: 'must be a UUID' }),
  patch: patchSchema,
});
export type Edit = z.infer<typeof editSchema>;

/** Somebody's edit as the server recorded it. */
export const recordedEditSchema = z.object({
  revision: z.number().int(),
  patch: patchSchema,
  by: z.object({ id: z.uuid(), name: z.string() }),
  /** By which its author's browser knows it again. */
  idempotencyKey: z.uuid(),
});
export type RecordedEdit = z.infer<typeof recordedEditSchema>;

/** Answer to a saved edit: the new revision, and what others changed since the base, to be applied first. */
export const editSavedSchema = z.object({
  revision: z.number().int(),
  others: z.array(recordedEditSchema),
});
export type EditSaved = z.infer<typeof editSavedSchema>;

/** The 409 body's extra part: where the draft stands and what changed since the base revision. */
export const conflictSchema = z.object({
  revision: z.number().int(),
  others: z.array(recordedEditSchema),
});
export type Conflict = z.infer<typeof conflictSchema>;

export const openLayoutSchema = z.object({
  id: z.uuid(),
  commission: z.object({
    id: z.uuid(),
    title: z.string(),
    client: z.string().nullable(),
    archived: z.boolean(),
  }),
  revision: z.number().int(),
  layout: layoutFileSchema,
  /** The version the draft goes on from, and whether the draft differs from it. */
  lastVersion: z.object({ number: z.number().int(), revision: z.number().int() }).nullable(),
});
export type OpenLayout = z.infer<typeof openLayoutSchema>;
