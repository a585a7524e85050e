import { hash, verify } from '@node-rs/argon2';

/** OWASP's least for argon2id (Password Storage Cheat Sheet): 19 MiB, two passes, one lane. */
const COST = { memoryCost: 19_456, timeCost: 2, parallelism: 1 } as const;

/** The argon2id hash of a password, in the encoded form that carries its parameters. */
export function hashPassword(password: string): Promise<string> {
  return hash(password, COST);
}

let nobodysHash: Promise<string> | undefined;

/**
 * True when the password belongs to the hash. For nobody (null) it does the same work and says false, so
 * that the time an answer takes does not tell whether an e-mail address is known.
 */
export async function passwordMatches(hashed: string | null, password: string): Promise<boolean> {
  nobodysHash ??= hashPassword('the password of nobody');
  const matches = await verify(hashed ?? (await nobodysHash), password);
  return hashed !== null && matches;
}
