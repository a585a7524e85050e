import { Component, inject } from '@angular/core';
import { FormControl, FormGroup, ReactiveFormsModule, Validators } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MAT_DIALOG_DATA, MatDialogModule, MatDialogRef } from '@angular/material/dialog';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInputModule } from '@angular/material/input';
import { BOUNDS, type Wood } from '@shared/layout/schema';
import type { WoodWords } from '@shared/layout/wood-changes';
import { ChoiceBar } from '../../../drawing/choice-bar';

export interface WoodQuestion {
  /** The wood to change, or null for a new one. */
  readonly wood: Wood | null;
}

const COLOUR = /^#[0-9A-Fa-f]{6}$/;

/** Name, colour, species and way of sawing of a wood; answers with them, or with nothing. */
@Component({
  selector: 'sl-wood-dialog',
  imports: [
    ChoiceBar,
    MatButton,
    MatDialogModule,
    MatFormFieldModule,
    MatInputModule,
    ReactiveFormsModule,
  ],
  templateUrl: './wood-dialog.html',
  styleUrl: './wood-dialog.scss',
})
export class WoodDialog {
  protected readonly question = inject<WoodQuestion>(MAT_DIALOG_DATA);
  private readonly dialog = inject<MatDialogRef<WoodDialog, WoodWords>>(MatDialogRef);
  protected readonly nameMost = BOUNDS.nameLength.most;
  protected readonly sawn = [
    { value: 'flat', label: 'Flat' },
    { value: 'rift', label: 'Rift' },
    { value: 'quarter', label: 'Quarter' },
  ] as const;

  protected readonly form = new FormGroup({
    name: text(this.question.wood?.name ?? ''),
    colour: new FormControl(this.question.wood?.colour ?? '#B98A5A', {
      nonNullable: true,
      validators: [Validators.required, Validators.pattern(COLOUR)],
    }),
    species: new FormControl(this.question.wood?.species ?? '', {
      nonNullable: true,
      validators: [Validators.maxLength(BOUNDS.nameLength.most)],
    }),
    sawn: new FormControl<Wood['sawn']>(this.question.wood?.sawn ?? 'flat', { nonNullable: true }),
  });

  protected setColour(colour: string): void {
    this.form.controls.colour.setValue(colour.toUpperCase());
  }

  protected setSawn(sawn: Wood['sawn']): void {
    this.form.controls.sawn.setValue(sawn);
  }

  protected take(): void {
    this.form.markAllAsTouched();
    if (this.form.invalid) return;
    const { name, colour, species, sawn } = this.form.getRawValue();
    const latin = species.trim();
    const words = { name: name.trim(), colour, sawn };
    this.dialog.close(latin === '' ? words : { ...words, species: latin });
  }
}

function text(value: string): FormControl<string> {
  return new FormControl(value, {
    nonNullable: true,
    validators: [
      Validators.required,
      Validators.pattern(/\S/),
      Validators.maxLength(BOUNDS.nameLength.most),
    ],
  });
}
