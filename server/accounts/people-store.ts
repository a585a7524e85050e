import type { Queries } from '@drizzle/database';
import { memberships, people, workshops } from '@drizzle/schema/index';
import type { Person } from '@shared/api/session';
import { asc, eq } from 'drizzle-orm';

/** The id and password hash of whoever has this e-mail address, or null. */
export async function findCredentials(
  queries: Queries,
  email: string,
): Promise<{ id: string; passwordHash: string } | null> {
  const [found] = await queries
    .select({ id: people.id, passwordHash: people.passwordHash })
    .from(people)
    .where(eq(people.email, email.toLowerCase()));
  return found ?? null;
}

/** A person as the session answers them, in the workshop they joined first; null without a membership. */
export async function findPerson(queries: Queries, id: string): Promise<Person | null> {
  const [found] = await queries
    .select({
      id: people.id,
      name: people.name,
      email: people.email,
      roles: memberships.roles,
      workshop: { id: workshops.id, name: workshops.name },
    })
    .from(people)
    .innerJoin(memberships, eq(memberships.personId, people.id))
    .innerJoin(workshops, eq(workshops.id, memberships.workshopId))
    .where(eq(people.id, id))
    .orderBy(asc(memberships.since))
    .limit(1);
  return found ?? null;
}
