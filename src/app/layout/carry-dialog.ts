import { Component, inject, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MAT_DIALOG_DATA, MatDialogModule } from '@angular/material/dialog';
import type { Carry, CarriedWay } from '@shared/layout/carry';
import type { Layout } from '@shared/layout/schema';
import { PatternSketch } from '../drawing/pattern-sketch';
import { carryWords, sizeWords } from './carry-words';

export interface CarryQuestion {
  readonly layout: Layout;
  /** The ways that come out differently, at least two. */
  readonly ways: readonly CarriedWay[];
}

/** Asks how the pattern is carried over to another size, with a picture of each; answers with the way. */
@Component({
  selector: 'sl-carry-dialog',
  imports: [MatButton, MatDialogModule, PatternSketch],
  template: `
    <h2 mat-dialog-title>Carry the pattern over to {{ size }}</h2>
    <mat-dialog-content>
      <fieldset>
        <legend>The pattern was laid on {{ sizeBefore }}. What becomes of it?</legend>
        @for (way of ways; track way.carry) {
          <label>
            <input
              type="radio"
              name="carry"
              [value]="way.carry"
              [checked]="way.carry === chosen()"
              (change)="chosen.set(way.carry)"
            />
            <span class="words">
              <b>{{ way.name }}</b>
              <span class="says">{{ way.says }}</span>
            </span>
            <sl-pattern-sketch
              [pattern]="way.after"
              [colours]="colours"
              [proportion]="proportion"
              [label]="way.name + ': the pattern afterwards'"
            />
          </label>
        }
      </fieldset>
      <p>Undo brings the size and every tile back in one step.</p>
    </mat-dialog-content>
    <mat-dialog-actions align="end">
      <button matButton type="button" [mat-dialog-close]="null">Leave the size</button>
      <button matButton="filled" type="button" [mat-dialog-close]="chosen()">
        Change the size
      </button>
    </mat-dialog-actions>
  `,
  styles: `
    fieldset {
      display: grid;
      gap: 10px;
      margin: 0;
      padding: 0;
      border: 0;
    }
    legend {
      margin-bottom: 12px;
      padding: 0;
    }
    label {
      --sketch-height: 96px;
      display: grid;
      grid-template-columns: 20px minmax(0, 1fr) minmax(0, 1.2fr);
      gap: 12px;
      align-items: center;
      padding: 12px 14px;
      border: 1px solid var(--line);
      border-radius: var(--radius);
      cursor: pointer;
    }
    label:has(input:checked) {
      border-color: var(--blue);
      background: var(--pale-blue);
    }
    input {
      width: 18px;
      height: 18px;
      margin: 0;
      accent-color: var(--blue);
    }
    .words {
      display: grid;
      gap: 2px;
    }
    .says {
      font-size: 14px;
      line-height: 1.4;
    }
    p {
      margin: 14px 0 0;
      color: var(--mute);
    }
    @media (max-width: 599px) {
      label {
        grid-template-columns: 20px minmax(0, 1fr);
      }
      sl-pattern-sketch {
        grid-column: 2;
      }
    }
  `,
})
export class CarryDialog {
  private readonly question = inject<CarryQuestion>(MAT_DIALOG_DATA);
  private readonly shell = this.question.layout.shell;
  protected readonly colours = this.question.layout.woods.map((wood) => wood.colour);
  protected readonly proportion = this.shell.tileHeight / this.shell.tileWidth;
  protected readonly ways = this.question.ways.map((way) => ({
    ...way,
    ...carryWords(way.carry, this.shell, way.after, this.question.layout.woods[0]?.name ?? ''),
  }));
  protected readonly size = sizeWords(this.question.ways[0]?.after ?? this.shell);
  protected readonly sizeBefore = sizeWords(this.shell);
  protected readonly chosen = signal<Carry>(this.question.ways[0]?.carry ?? 'keep');
}
