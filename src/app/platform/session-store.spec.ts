import { provideHttpClient, withInterceptors } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { provideRouter, Router } from '@angular/router';
import type { Person } from '@shared/api/session';
import { beforeEach, describe, expect, it } from 'vitest';
import { apiErrors } from './api-errors';
import { SessionStore } from './session-store';

const INES: Person = {
  id: '4b1f0c52-5a38-4b0f-9a54-0d6a3f6f2a10',
  name: 'Ines Marlow',
  email: 'ines@quarrylane.example',
  roles: ['designer', 'maker'],
  workshop: { id: '4b1f0c52-5a38-4b0f-9a54-0d6a3f6f2a11', name: 'Quarry Lane Shells' },
};
const CREDENTIALS = { email: INES.email, password: 'ring-of-staves' };

describe('the session', () => {
  let http: HttpTestingController;
  let store: SessionStore;
  const settled = () => new Promise((resolve) => setTimeout(resolve));

  beforeEach(() => {
    TestBed.configureTestingModule({
      providers: [
        provideRouter([]),
        provideHttpClient(withInterceptors([apiErrors])),
        provideHttpClientTesting(),
      ],
    });
    http = TestBed.inject(HttpTestingController);
    store = TestBed.inject(SessionStore);
  });

  it('is asked for once, however many pages want to know', async () => {
    const both = Promise.all([store.load(), store.load()]);
    http.expectOne('/api/session').flush({ person: INES });
    expect(await both).toEqual([INES, INES]);
    expect(store.may('edit-joint')).toBe(true);
    expect(store.may('manage-workshop')).toBe(false);
  });

  it('is asked for again after the server was away', async () => {
    const first = store.load();
    http.expectOne('/api/session').error(new ProgressEvent('error'));
    await expect(first).rejects.toMatchObject({ code: 'unavailable' });
    const second = store.load();
    http.expectOne('/api/session').flush({ person: null });
    expect(await second).toBeNull();
  });

  it('fetches a new token and signs in once more when the page stood open too long', async () => {
    const signedIn = store.signIn(CREDENTIALS);
    http
      .expectOne({ method: 'POST', url: '/api/session' })
      .flush(
        { code: 'forged-request', message: 'The token is not valid.', requestId: 'r' },
        { status: 403, statusText: 'Forbidden' },
      );
    await settled();
    http.expectOne({ method: 'GET', url: '/api/session' }).flush({ person: null });
    await settled();
    http.expectOne({ method: 'POST', url: '/api/session' }).flush({ person: INES });
    expect(await signedIn).toEqual(INES);
  });

  it('that ended leads to the sign-in page and remembers the way back', async () => {
    const router = TestBed.inject(Router);
    router.resetConfig([{ path: '**', children: [] }]);
    await router.navigateByUrl('/commissions?show=cutting');
    const left = store.signOut().catch((failure: unknown) => failure);
    http
      .expectOne({ method: 'DELETE', url: '/api/session' })
      .flush(
        { code: 'not-signed-in', message: 'Sign in first.', requestId: 'r' },
        { status: 401, statusText: 'Unauthorized' },
      );
    await left;
    await settled();
    expect(router.url).toBe('/sign-in?next=%2Fcommissions%3Fshow%3Dcutting&ended=true');
  });
});
