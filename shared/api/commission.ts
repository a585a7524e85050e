import * as z from 'zod';
import { lineOfText } from '../layout/schema';

export const STAGES = [
  'design',
  'with-client',
  'approved',
  'cutting',
  'assembly',
  'delivered',
] as const;
export const stageSchema = z.enum(STAGES, { error: `must be one of ${STAGES.join(', ')}` });
export type Stage = z.infer<typeof stageSchema>;

const DUE_RANGE = 'must be a date from 2000 to 2199, such as 2027-03-14';

const dueSchema = z.iso
  .date({ error: DUE_RANGE })
  .refine((date) => date >= '2000' && date < '2200', DUE_RANGE)
  .nullable();

/** A new commission: from a layout file, or from the starting layout when `layout` is left out. */
export const newCommissionSchema = z.strictObject({
  title: lineOfText(120),
  client: lineOfText(120).nullable().default(null),
  due: dueSchema.default(null),
  /** A parsed layout file (`staveloom-layout`); checked by the layout schema. */
  layout: z.unknown().optional(),
});
export type NewCommission = z.input<typeof newCommissionSchema>;

export const commissionChangesSchema = z.strictObject({
  title: lineOfText(120).optional(),
  client: lineOfText(120).nullable().optional(),
  due: dueSchema.optional(),
  stage: stageSchema.optional(),
  archived: z.boolean({ error: 'must be true or false' }).optional(),
});
export type CommissionChanges = z.infer<typeof commissionChangesSchema>;

/** A small picture of the pattern: at most 48 × 24 sampled tiles, each the index of a colour. */
export const thumbnailSchema = z.object({
  staves: z.number().int(),
  courses: z.number().int(),
  colours: z.array(z.string()),
  /** base64, one byte a tile, course by course from the bottom */
  cells: z.string(),
});
export type Thumbnail = z.infer<typeof thumbnailSchema>;

export const commissionSchema = z.object({
  id: z.uuid(),
  layoutId: z.uuid(),
  title: z.string(),
  client: z.string().nullable(),
  due: z.string().nullable(),
  stage: stageSchema,
  archived: z.boolean(),
  staves: z.number().int(),
  courses: z.number().int(),
  /** Names of the woods laid, most tiles first. */
  woods: z.array(z.string()),
  thumbnail: thumbnailSchema,
  lastVersion: z
    .object({ number: z.number().int(), keptAt: z.string(), keptBy: z.string() })
    .nullable(),
  updatedAt: z.string(),
});
export type Commission = z.infer<typeof commissionSchema>;

export const commissionListSchema = z.object({ commissions: z.array(commissionSchema) });
export type CommissionList = z.infer<typeof commissionListSchema>;

/** The choice of the list: those at work, those in the archive, or (left out) both. */
export const commissionFilterSchema = z.strictObject({
  archived: z.enum(['true', 'false'], { error: 'must be "true" or "false"' }).optional(),
});
