import * as z from 'zod';
import { CONTROL_CHARACTER } from '../layout/schema';

/** What the maker chooses about a bundle. */
export const bundleRequestSchema = z.strictObject({
  dxf: z.enum(['r2000', 'r12'], { error: 'must be "r2000" or "r12"' }).default('r2000'),
  unit: z.enum(['mm', 'in'], { error: 'must be "mm" or "in"' }).default('mm'),
  centrePath: z.boolean({ error: 'must be true or false' }).default(false),
  /** Written reason to go on in spite of a stop; recorded with the person's name. */
  override: z
    .strictObject({
      reason: z
        .string({ error: 'must be text' })
        .trim()
        .min(3, 'must say why, in at least 3 characters')
        .max(500, 'must be at most 500 characters')
        .refine((text) => !CONTROL_CHARACTER.test(text), 'must not contain control characters'),
    })
    .optional(),
});
export type BundleRequest = z.input<typeof bundleRequestSchema>;
