import type { ValidatorFn } from '@angular/forms';
import type * as z from 'zod';
import { sentenceOf } from './sentences';

/**
 * Checks a control with the schema the server uses, so that both say the same. The error is
 * `{ schema: sentence }`; `subject` begins the sentence ("The title").
 */
export function matches(schema: z.ZodType, subject: string): ValidatorFn {
  return (control) => {
    const result = schema.safeParse(control.value);
    if (result.success) return null;
    return { schema: sentenceOf(subject, result.error.issues[0]?.message ?? 'cannot be read') };
  };
}

/** The same for a field that may be left empty. */
export function matchesIfGiven(schema: z.ZodType, subject: string): ValidatorFn {
  const whenGiven = matches(schema, subject);
  return (control) => (control.value === '' ? null : whenGiven(control));
}
