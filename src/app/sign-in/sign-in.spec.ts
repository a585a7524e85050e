import { Component, signal } from '@angular/core';
import { TestBed, type ComponentFixture } from '@angular/core/testing';
import { provideRouter, Router } from '@angular/router';
import { beforeEach, describe, expect, it, vi } from 'vitest';
import { ApiFailure } from '../platform/api-problem';
import { SessionStore } from '../platform/session-store';
import { SignIn } from './sign-in';
import { TurningShell } from './turning-shell';

@Component({ selector: 'sl-turning-shell', template: '' })
class NoShell {}

describe('signing in', () => {
  let fixture: ComponentFixture<SignIn>;
  const signIn = vi.fn();
  const load = vi.fn();
  const page = () => fixture.nativeElement as HTMLElement;
  const field = (type: string) => page().querySelector<HTMLInputElement>(`input[type=${type}]`)!;

  async function submit(email: string, password: string): Promise<void> {
    for (const [input, value] of [
      [field('email'), email],
      [field('password'), password],
    ] as const) {
      input.value = value;
      input.dispatchEvent(new Event('input'));
    }
    page().querySelector('form')!.dispatchEvent(new Event('submit'));
    await fixture.whenStable();
  }

  beforeEach(async () => {
    signIn.mockReset().mockResolvedValue(null);
    load.mockReset().mockResolvedValue(null);
    TestBed.configureTestingModule({
      providers: [
        provideRouter([{ path: '**', children: [] }]),
        { provide: SessionStore, useValue: { signIn, load, person: signal(null) } },
      ],
    });
    TestBed.overrideComponent(SignIn, {
      remove: { imports: [TurningShell] },
      add: { imports: [NoShell] },
    });
    fixture = TestBed.createComponent(SignIn);
    await fixture.whenStable();
  });

  it('goes on to the page that was asked for', async () => {
    fixture.componentRef.setInput('next', '/commissions?show=cutting');
    await submit('ines@quarrylane.example', 'ring-of-staves');
    expect(TestBed.inject(Router).url).toBe('/commissions?show=cutting');
  });

  it('never goes on to another site', async () => {
    fixture.componentRef.setInput('next', '//elsewhere.example/trap');
    await submit('ines@quarrylane.example', 'ring-of-staves');
    expect(TestBed.inject(Router).url).toBe('/');
  });

  it('says at once when the server is away, and lets through who is signed in when it is back', async () => {
    load.mockRejectedValueOnce(new ApiFailure(0, 'unavailable', 'Away.'));
    fixture = TestBed.createComponent(SignIn);
    fixture.componentRef.setInput('next', '/commissions');
    await fixture.whenStable();
    expect(page().querySelector('[role=alert]')?.textContent).toContain('does not answer');
    load.mockResolvedValueOnce({ name: 'Ines Marlow' });
    page().querySelector<HTMLButtonElement>('[role=alert] button')!.click();
    await fixture.whenStable();
    expect(TestBed.inject(Router).url).toBe('/commissions');
  });

  it('says what is missing before it asks the server', async () => {
    await submit('ines', '');
    expect(signIn).not.toHaveBeenCalled();
    expect(page().textContent).toContain('This must be an e-mail address.');
    expect(page().textContent).toContain('The password must not be empty.');
  });

  it.each([
    [new ApiFailure(401, 'wrong-credentials', 'No.'), 'do not belong together'],
    [
      new ApiFailure(429, 'too-many-requests', 'Too many attempts. Wait 15 minutes.'),
      'Wait 15 minutes',
    ],
    [new ApiFailure(0, 'unavailable', 'Away.'), 'The server does not answer'],
  ])('answers a refusal with a sentence: %s', async (failure, sentence) => {
    signIn.mockRejectedValue(failure);
    await submit('ines@quarrylane.example', 'wrong');
    expect(page().querySelector('[role=alert]')?.textContent).toContain(sentence);
    expect(TestBed.inject(Router).url).toBe('/');
  });
});
