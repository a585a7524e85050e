import { problemsOfIssue } from '@shared/layout/read-layout';
import type { Problem } from '@shared/layout/schema';
import type * as z from 'zod';
import { badInput } from './errors';

/** The value a schema makes of unknown input. Throws `bad-input` with every field that is wrong. */
export function validated<S extends z.ZodType>(schema: S, value: unknown): z.output<S> {
  const read = schema.safeParse(value);
  if (read.success) return read.data;
  throw badInput(
    read.error.issues.flatMap((issue) =>
      problemsOfIssue(issue).map(({ field, message }) => ({
        field: issue.path.length === 0 && field === 'file' ? '' : field,
        message,
      })),
    ),
  );
}

/** Problems of a layout that lies inside a body, under the name of the place it lies in. */
export function problemsWithin(place: string, problems: readonly Problem[]): Problem[] {
  return problems.map(({ field, message }) => ({
    field: field === 'file' ? place : `${place}.${field}`,
    message,
  }));
}
