import { Component, input, output, signal } from '@angular/core';
import { FormControl, ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { bundleRequestSchema } from '@shared/api/bundle';
import type { CheckResult } from '@shared/checks/check';
import { FigureText } from '../../drawing/figure-text';
import { Lamp } from '../../drawing/lamp';

const reasonSchema = bundleRequestSchema.shape.override.unwrap().shape.reason;

/** Why a version is stopped; whoever may go on in spite of it says so in writing here. */
@Component({
  selector: 'sl-stopped-version',
  imports: [FigureText, Lamp, MatButton, MatFormFieldModule, MatInput, ReactiveFormsModule],
  template: `
    <div class="stopped">
      <h3><sl-lamp state="stop" /> Version {{ number() }} is stopped</h3>
      <ul>
        @for (stop of stops(); track stop.key) {
          <li>
            <sl-figure-text [text]="stop.finding" />&ngsp;<sl-figure-text [text]="stop.remedy" />
          </li>
        }
      </ul>
      @if (mayGoOn() === 'may') {
        @if (writing() === 'open') {
          <form (submit)="send($event)">
            <mat-form-field>
              <mat-label>Why you go on</mat-label>
              <textarea matInput rows="3" [formControl]="reason"></textarea>
              <mat-hint>3 to 500 characters. The bundle says it with your name.</mat-hint>
              @if (reason.hasError('reason')) {
                <mat-error>The reason {{ reason.getError('reason') }}.</mat-error>
              }
            </mat-form-field>
            <button matButton="filled" type="submit" [disabled]="busy() === 'busy'">
              Download in spite of {{ stops().length === 1 ? 'the stop' : 'the stops' }}
            </button>
            <button matButton type="button" (click)="writing.set('closed')">Not now</button>
          </form>
        } @else {
          <p>Mend it, or go on in writing if you know better.</p>
          <button matButton="outlined" type="button" (click)="writing.set('open')">
            Go on in writing
          </button>
        }
      } @else {
        <p>Mend it at its station, or ask a maker or owner, who may go on in writing.</p>
      }
    </div>
  `,
  styleUrl: './stopped-version.scss',
})
export class StoppedVersion {
  readonly number = input.required<number>();
  readonly stops = input.required<readonly CheckResult[]>();
  readonly busy = input<'busy' | 'free'>('free');
  readonly mayGoOn = input<'may' | 'ask'>('may');
  /** The reason in writing. */
  readonly goOn = output<string>();

  protected readonly writing = signal<'open' | 'closed'>('closed');
  protected readonly reason = new FormControl('', {
    nonNullable: true,
    validators: ({ value }) => {
      const parsed = reasonSchema.safeParse(value);
      return parsed.success ? null : { reason: parsed.error.issues[0]?.message };
    },
  });

  protected send(event: Event): void {
    event.preventDefault();
    this.reason.markAsTouched();
    if (this.reason.valid && this.busy() === 'free') this.goOn.emit(this.reason.value.trim());
  }
}
