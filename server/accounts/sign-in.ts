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
  return settled((done) => {
    const authenticating = passport.authenticate('local', { session: false }, done) as (
      request: Request,
      response: unknown,
      next: (error: unknown) => void,
    ) => void;
    authenticating(request, request.res, done);
  });
}

/** Begins a session for the person under a new id; whatever session there was before is destroyed. */
export async function beginSession(request: Request, person: Person): Promise<void> {
  await settled((done) => request.logIn(person, done));
}

/** Ends the session, here and in the database; passport begins an empty one, which goes as well. */
export async function endSession(request: Request): Promise<void> {
  await settled((done) => request.logOut(done));
  await settled((done) => request.session.destroy(done));
}

type Done<T> = (error: unknown, value?: T | false) => void;

/** What a function with a callback at its end answers; null when it answers nothing. */
function settled<T>(begin: (done: Done<T>) => void): Promise<T | null> {
  return new Promise((resolve, reject) => {
    begin((error, value) => {
      if (error === null || error === undefined) resolve(value || null);
      else reject(error instanceof Error ? error : new Error('passport failed', { cause: error }));
    });
  });
}
