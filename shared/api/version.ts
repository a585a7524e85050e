import * as z from 'zod';
import { CONTROL_CHARACTER, layoutFileSchema } from '../layout/schema';
import { thumbnailSchema } from './commission';

/** A note on a version: may be empty, may have several lines. */
export const noteSchema = z
  .string({ error: 'must be text' })
  .max(2000, 'must be at most 2000 characters')
  .refine(
    (text) => !CONTROL_CHARACTER.test(text.replaceAll('\n', '')),
    'must not contain control characters',
  );

export const keepVersionSchema = z.strictObject({
  /** The revision of the draft as the person saw it; another one answers 409. */
  revision: z.int({ error: 'must be a whole number' }).min(0),
  note: noteSchema.default(''),
});
export type KeepVersion = z.input<typeof keepVersionSchema>;

export const restoreVersionSchema = z.strictObject({ note: noteSchema.default('') });
export type RestoreVersion = z.input<typeof restoreVersionSchema>;

export const versionSchema = z.object({
  number: z.number().int(),
  note: z.string(),
  keptAt: z.string(),
  keptBy: z.string(),
  /** The revision of the draft it was kept from. */
  revision: z.number().int(),
  restoredFrom: z.number().int().nullable(),
  thumbnail: thumbnailSchema,
});
export type Version = z.infer<typeof versionSchema>;

export const versionListSchema = z.object({ versions: z.array(versionSchema) });
export type VersionList = z.infer<typeof versionListSchema>;

export const versionDetailSchema = versionSchema.extend({ layout: layoutFileSchema });
export type VersionDetail = z.infer<typeof versionDetailSchema>;

/** Restoring makes a new version and sets the draft to it. */
export const versionKeptSchema = z.object({
  version: versionSchema,
  draft: z.object({ revision: z.number().int() }),
});
export type VersionKept = z.infer<typeof versionKeptSchema>;
