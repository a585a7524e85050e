import * as z from 'zod';

/** Whether the server can do its work: "unavailable" while its database does not answer. */
export const healthSchema = z.object({
  status: z.enum(['ok', 'unavailable']),
  database: z.enum(['up', 'down']),
});
export type Health = z.infer<typeof healthSchema>;
