import {
  Component,
  computed,
  inject,
  input,
  signal,
  viewChild,
  type ElementRef,
} from '@angular/core';
import { FormControl, FormGroup, ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { Router } from '@angular/router';
import { signInSchema } from '@shared/api/session';
import { ShellMark } from '../drawing/shell-mark';
import { apiFailureOf, type ApiFailure } from '../platform/api-problem';
import { matches } from '../platform/schema-validator';
import { SessionStore } from '../platform/session-store';
import { TurningShell } from './turning-shell';

/** The plain page of someone who is not signed in. */
@Component({
  selector: 'sl-sign-in',
  imports: [MatButton, MatFormFieldModule, MatInput, ReactiveFormsModule, ShellMark, TurningShell],
  templateUrl: './sign-in.html',
  styleUrl: './sign-in.scss',
})
export class SignIn {
  /** Where to go afterwards: an address within the program. */
  readonly next = input<string>();
  /** Set when a session ended by itself. */
  readonly ended = input<string>();

  private readonly session = inject(SessionStore);
  private readonly router = inject(Router);
  private readonly email = viewChild.required<ElementRef<HTMLInputElement>>('email');
  private readonly password = viewChild.required<ElementRef<HTMLInputElement>>('password');

  protected readonly form = new FormGroup({
    email: new FormControl('', {
      nonNullable: true,
      validators: matches(signInSchema.shape.email, 'This'),
    }),
    password: new FormControl('', {
      nonNullable: true,
      validators: matches(signInSchema.shape.password, 'The password'),
    }),
  });
  protected readonly waiting = signal(false);
  protected readonly passwordShown = signal(false);
  private readonly failure = signal<ApiFailure | null>(null);
  protected readonly serverAway = computed(() => this.failure()?.code === 'unavailable');
  protected readonly sentence = computed(() => {
    const failure = this.failure();
    return failure === null ? null : sentenceFor(failure);
  });

  constructor() {
    void this.lookForSession();
  }

  /** Someone who came here only because the server was away is let through once it is back. */
  protected async lookForSession(): Promise<void> {
    this.failure.set(null);
    try {
      const person = await this.session.load();
      if (person !== null) await this.router.navigateByUrl(addressWithin(this.next()));
    } catch (thrown) {
      this.failure.set(apiFailureOf(thrown));
    }
  }

  protected async submit(): Promise<void> {
    if (this.waiting()) return;
    this.form.markAllAsTouched();
    if (this.form.invalid) {
      const wrong = this.form.controls.email.invalid ? this.email() : this.password();
      wrong.nativeElement.focus();
      return;
    }
    this.waiting.set(true);
    this.failure.set(null);
    try {
      await this.session.signIn(this.form.getRawValue());
      await this.router.navigateByUrl(addressWithin(this.next()));
    } catch (thrown) {
      this.failure.set(apiFailureOf(thrown));
      this.password().nativeElement.select();
    } finally {
      this.waiting.set(false);
    }
  }
}

/** Only addresses within the program: a link from outside must not lead somewhere else. */
function addressWithin(next: string | undefined): string {
  return next !== undefined && /^\/(?![/\\])/.test(next) ? next : '/';
}

function sentenceFor(failure: ApiFailure): string {
  if (failure.code === 'wrong-credentials') {
    return 'This e-mail address and this password do not belong together. Check both and try again.';
  }
  if (failure.code === 'unavailable') {
    return 'The server does not answer. Check the connection of this computer and try again in a moment.';
  }
  return failure.message;
}
