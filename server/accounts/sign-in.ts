import type { Database } from '@drizzle/database';
import type { Person } from '@shared/api/session';
import type { Request } from 'express';
import passports from 'passport';
import { Strategy } from 'passport-local';
import { findCredentials, findPerson } from './people-store';
import { passwordMatches } from './passwords';

export type SignInPassport = InstanceType<typeof passports.Passport>;

/** Passport with e-mail and password; the session holds only the person's id, roles are read anew each time. */
export function createPassport(database: Database): SignInPassport {
  const passport = new passports.Passport();
  passport.use(
    new Strategy({ usernameField: 'email' }, (email, password, done) => {
      personOf(database, email, password).then((person) => done(null, person ?? false), done);
    }),
  );
  passport.serializeUser((person, done) => done(null, person.id));
  passport.deserializeUser((id: string, done) => {
    findPerson(database, id).then((person) => done(null, person ?? false), done);
  });
  return passport;
}

async function personOf(
  database: Database,
  email: string,
  password: string,
): Promise<Person | null> {
  const credentials = await findCredentials(database, email);
  const matches = await passwordMatches(credentials?.passwordHash ?? null, password);
  return credentials && matches ? findPerson(database, credentials.id) : null;
}

/** The person whose e-mail and password the body holds, or null. */
export function authenticate(passport: SignInPassport, request: Request): Promise<Person | null> {
  return new Promise((resolve, reject) => {
    const answer = (error: unknown, person: Person | false) =>
      error ? reject(error) : resolve(person || null);
    passport.authenticate('local', { session: false }, answer)(request, request.res, reject);
  });
}

/** Begins a session for the person under a new id; whatever session there was before is destroyed. */
export function beginSession(request: Request, person: Person): Promise<void> {
  return new Promise((resolve, reject) => {
    request.logIn(person, (error: unknown) => (error ? reject(error) : resolve()));
  });
}

/** Ends the session, here and in the database. */
export function endSession(request: Request): Promise<void> {
  return new Promise((resolve, reject) => {
    request.logOut((error: unknown) => (error ? reject(error) : resolve()));
  });
}
