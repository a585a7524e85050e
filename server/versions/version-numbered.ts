import type { Database } from '@drizzle/database';
import type { Person } from '@shared/api/session';
import { notFound } from '../http/errors';
import { isLayoutOf } from '../layouts/layouts-store';
import { findVersion } from './versions-store';

/** A version of one of the person's workshop's layouts; throws `not-found` otherwise. */
export async function versionNumbered(
  database: Database,
  person: Person,
  { id, number }: { readonly id: string; readonly number: number },
) {
  if (!(await isLayoutOf(database, person.workshop.id, id))) throw notFound('layout');
  const found = await findVersion(database, id, number);
  if (!found) throw notFound('version');
  return found;
}
