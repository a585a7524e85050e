import { HttpClient } from '@angular/common/http';
import { computed, inject, Injectable, signal } from '@angular/core';
import { may, type Right } from '@shared/api/rights';
import type { Person, Session, SignIn } from '@shared/api/session';
import { firstValueFrom } from 'rxjs';
import { apiFailureOf } from './api-problem';

/** Who is signed in, asked once at start and kept as a signal. */
@Injectable({ providedIn: 'root' })
export class SessionStore {
  private readonly http = inject(HttpClient);
  private readonly current = signal<Person | null>(null);
  private asked: Promise<Person | null> | null = null;

  readonly person = this.current.asReadonly();
  readonly roles = computed(() => this.current()?.roles ?? []);

  /** The person signed in, or null. Asks the server the first time; rejects with an ApiFailure. */
  async load(): Promise<Person | null> {
    this.asked ??= this.ask();
    try {
      return await this.asked;
    } catch (failure) {
      this.asked = null;
      throw failure;
    }
  }

  /** True when the person signed in has the right; a signal is read, so templates follow it. */
  may(right: Right): boolean {
    return may(this.roles(), right);
  }

  /** Signs in; rejects with an ApiFailure ("wrong-credentials", "too-many-requests", …). */
  async signIn(credentials: SignIn): Promise<Person | null> {
    const ask = () => firstValueFrom(this.http.post<Session>('/api/session', credentials));
    try {
      return this.remember((await ask()).person);
    } catch (thrown) {
      if (apiFailureOf(thrown).code !== 'forged-request') throw thrown;
      // The page stood open longer than its token lived: fetch a new one and ask once more.
      await this.ask();
      return this.remember((await ask()).person);
    }
  }

  /** Ends the session on the server, then here; rejects with an ApiFailure and stays signed in. */
  async signOut(): Promise<void> {
    await firstValueFrom(this.http.delete('/api/session'));
    this.forget();
  }

  /** The server no longer knows us: forget the person, ask again next time. */
  forget(): void {
    this.current.set(null);
    this.asked = null;
  }

  private async ask(): Promise<Person | null> {
    const session = await firstValueFrom(this.http.get<Session>('/api/session'));
    this.current.set(session.person);
    return session.person;
  }

  private remember(person: Person | null): Person | null {
    this.current.set(person);
    this.asked = Promise.resolve(person);
    return person;
  }
}
