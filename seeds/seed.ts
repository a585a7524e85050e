/**
 * Puts the demonstration into a migrated database: `tsx seeds/seed.ts [--among-others]` with DATABASE_URL
 * set. A second run changes nothing. A database that holds somebody else's people is left alone unless
 * `--among-others` says that it may be filled up.
 */
import { fileURLToPath } from 'node:url';
import { openDatabase, type Transaction } from '@drizzle/database';
import { memberships, people, workshops } from '@drizzle/schema/index';
import { hash } from '@node-rs/argon2';
import { count, inArray, sql } from 'drizzle-orm';
import { seedCommission, type Planting } from './commissions';
import { COMMISSIONS, DEMONSTRATION_PASSWORD, PEOPLE, WORKSHOPS } from './demonstration';

export type SeedResult = 'seeded' | 'there already' | 'left alone';

export interface SeedOptions {
  /** What to do in a database that holds other people already. */
  readonly amongOthers: 'leave alone' | 'add';
}

/** Any number will do, as long as nothing else in the database uses it. */
const SEED_LOCK = 7_412_027;

/** Seeds in one transaction; of several at once the first does it. */
export async function seedDatabase(
  databaseUrl: string,
  { amongOthers }: SeedOptions,
): Promise<SeedResult> {
  const open = openDatabase(databaseUrl, { connections: 1, onConnectionLost: () => undefined });
  try {
    return await open.database.transaction(async (transaction) => {
      await transaction.execute(sql`SELECT pg_advisory_xact_lock(${SEED_LOCK})`);
      if (await isThere(transaction)) return 'there already';
      if (amongOthers === 'leave alone' && (await holdsOthers(transaction))) return 'left alone';
      await plant(transaction);
      return 'seeded';
    });
  } finally {
    await open.close();
  }
}

async function isThere(transaction: Transaction): Promise<boolean> {
  const emails = PEOPLE.map(({ email }) => email);
  const [found] = await transaction
    .select({ people: count() })
    .from(people)
    .where(inArray(people.email, emails));
  return (found?.people ?? 0) > 0;
}

async function holdsOthers(transaction: Transaction): Promise<boolean> {
  const [found] = await transaction.select({ people: count() }).from(people);
  return (found?.people ?? 0) > 0;
}

async function plant(transaction: Transaction): Promise<void> {
  const planting: Planting = {
    transaction,
    workshops: await plantWorkshops(transaction),
    people: await plantPeople(transaction),
    now: new Date(),
  };
  await transaction.insert(memberships).values(
    PEOPLE.map(({ email, workshop, roles }) => ({
      personId: planting.people.get(email) ?? '',
      workshopId: planting.workshops.get(workshop) ?? '',
      roles,
    })),
  );
  for (const commission of COMMISSIONS) await seedCommission(planting, commission);
}

async function plantWorkshops(transaction: Transaction): Promise<Map<string, string>> {
  const rows = await transaction
    .insert(workshops)
    .values(WORKSHOPS.map((name) => ({ name })))
    .returning({ id: workshops.id, name: workshops.name });
  return new Map(rows.map(({ id, name }) => [name, id]));
}

async function plantPeople(transaction: Transaction): Promise<Map<string, string>> {
  // the same cost as server/accounts/passwords.ts, which seeds may not import
  const cost = { memoryCost: 19_456, timeCost: 2, parallelism: 1 };
  const values = await Promise.all(
    PEOPLE.map(async ({ name, email }) => ({
      name,
      email,
      passwordHash: await hash(DEMONSTRATION_PASSWORD, cost),
    })),
  );
  const rows = await transaction
    .insert(people)
    .values(values)
    .returning({ id: people.id, email: people.email });
  return new Map(rows.map(({ id, email }) => [email, id]));
}

const SENTENCES: Readonly<Record<SeedResult, string>> = {
  seeded: 'The demonstration workshops are in the database.',
  'there already': 'The demonstration is in the database already; nothing was changed.',
  'left alone':
    'This database holds other people, so nothing was changed. Add --among-others to put the demonstration beside them.',
};

if (process.argv[1] === fileURLToPath(import.meta.url)) {
  const databaseUrl = process.env['DATABASE_URL'];
  if (!databaseUrl) {
    console.error('DATABASE_URL must name the PostgreSQL database to seed.');
    process.exit(1);
  }
  const amongOthers = process.argv.includes('--among-others') ? 'add' : 'leave alone';
  console.log(SENTENCES[await seedDatabase(databaseUrl, { amongOthers })]);
}
