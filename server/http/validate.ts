import type { Problem } from '@shared/layout/schema';
import type * as z from 'zod';
import { badInput } from './errors';

/** The value a schema makes of unknown input. Throws `bad-input` with every field that is wrong. */
export function validated<S extends z.ZodType>(schema: S, value: unknown): z.output<S> {
  const read = schema.safeParse(value);
  if (!read.success) throw badInput(problemsOfIssues(read.error.issues));
  return read.data;
}

type Issue = z.core.$ZodIssue;

/** Field and sentence of each issue; unknown keys are named one by one. */
export function problemsOfIssues(issues: readonly Issue[]): Problem[] {
  return issues.flatMap((issue) => {
    const field = issue.path.map(String).join('.');
    if (issue.code === 'unrecognized_keys') {
      return issue.keys.map((key) => ({
        field: field === '' ? key : `${field}.${key}`,
        message: 'is not known here',
      }));
    }
    return [{ field, message: issue.message }];
  });
}

/** Problems of a document that lies inside a body, with the name of the place it lies in. */
export function problemsWithin(place: string, problems: readonly Problem[]): Problem[] {
  return problems.map(({ field, message }) => ({
    field: field === '' ? place : `${place}.${field}`,
    message,
  }));
}
