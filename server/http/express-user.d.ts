import type { Person } from '@shared/api/session';

declare global {
  namespace Express {
    /** What passport puts on a request: the person signed in, as the session answers them. */
    interface User extends Readonly<Person> {
      readonly id: Person['id'];
    }
  }
}
