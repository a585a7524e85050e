import { problemsOfIssue } from '@shared/layout/read-layout';
import type { Problem } from '@shared/layout/schema';
import type * as z from 'zod';
import { badInput } from './errors';

/** The value a schema makes of unknown input. Throws `bad-input` with every field that is wrong. */
export function validated<S extends z.ZodType>(schema: S, value: unknown): z.output<S> {
  const read = schema.safeParse(value);
  if (!read.success) throw badInput(problemsOfIssues(read.error.issues));
  return read.data;
}

/** One problem a field, the first: an empty title need not hear that it is only spaces as well. */
function problemsOfIssues(issues: readonly z.core.$ZodIssue[]): Problem[] {
  const problems = new Map<string, Problem>();
  for (const issue of issues) {
    for (const problem of problemsOfIssue(issue)) {
      const whole = issue.path.length === 0 && problem.field === 'file';
      const field = whole ? '' : problem.field;
      if (!problems.has(field)) problems.set(field, { ...problem, field });
    }
  }
  return [...problems.values()];
}

/** Problems of a layout that lies inside a body, under the name of the place it lies in. */
export function problemsWithin(place: string, problems: readonly Problem[]): Problem[] {
  return problems.map(({ field, message }) => ({
    field: field === 'file' ? place : `${place}.${field}`,
    message,
  }));
}
