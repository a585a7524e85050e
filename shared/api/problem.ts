import * as z from 'zod';

/** What every refused request answers with: a sentence for people, a code for programs. */
export const problemSchema = z.object({
  code: z.enum([
    'bad-input',
    'not-signed-in',
    'wrong-credentials',
    'not-allowed',
    'not-found',
    'conflict',
    'stopped',
    'too-large',
    'too-many-requests',
    'forged-request',
    'unavailable',
    'failed',
  ]),
  message: z.string(),
  /** For bad-input: which field and what it must be. */
  fields: z.array(z.object({ field: z.string(), message: z.string() })).optional(),
  requestId: z.string(),
});

export type ApiProblem = z.infer<typeof problemSchema>;
export type ApiProblemCode = ApiProblem['code'];
