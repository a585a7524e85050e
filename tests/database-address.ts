import { Client } from 'pg';

/** The address of another database on the same server. */
export function databaseAddress(address: string, name: string): string {
  const url = new URL(address);
  url.pathname = `/${name}`;
  return url.toString();
}

/** Runs one statement on a connection of its own. */
export async function runAsAdministrator(address: string, statement: string): Promise<void> {
  const client = new Client({ connectionString: address });
  await client.connect();
  try {
    await client.query(statement);
  } finally {
    await client.end();
  }
}
