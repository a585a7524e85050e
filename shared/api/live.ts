import * as z from 'zod';
import { recordedEditSchema } from './layout';

/** Where somebody is in a layout. */
export const whereaboutsSchema = z.strictObject({
  /** One a browser tab. */
  connection: z.uuid({ error: 'must be a UUID' }),
  station: z.enum(['shell', 'joint', 'pattern', 'cutting', 'review'], {
    error: 'must name a station',
  }),
  /** The tile under the pointer or the keyboard, as stave and course from 0, or null. */
  tile: z
    .strictObject({ stave: z.int().min(0).max(239), course: z.int().min(0).max(119) })
    .nullable(),
});
export type Whereabouts = z.infer<typeof whereaboutsSchema>;

/** What a browser asks the stream with. */
export const liveQuerySchema = z.strictObject({
  /** The revision the browser has; edits after it are sent. */
  since: z.coerce
    .number({ error: 'must be a whole number' })
    .int('must be a whole number')
    .min(0, 'must be at least 0'),
  connection: z.uuid({ error: 'must be a UUID' }),
});

/** Somebody who has the layout open. */
export const presentSchema = whereaboutsSchema.extend({
  person: z.object({ id: z.uuid(), name: z.string() }),
});
export type Present = z.infer<typeof presentSchema>;

/**
 * The events of a layout's stream (text/event-stream): `edit` for every recorded edit in order, its revision
 * as the event's id; `people` with everybody present whenever somebody comes, moves or goes.
 */
export const liveEventSchemas = {
  edit: recordedEditSchema,
  people: z.object({ people: z.array(presentSchema) }),
} as const;
