import { Component, inject, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MAT_DIALOG_DATA, MatDialogModule } from '@angular/material/dialog';
import type { Wood } from '@shared/layout/schema';
import { figuresOf } from '../grain/wood-figure';
import { tilesWords } from '../sentence-words';
import { WoodStrip } from './wood-strip';

export interface RemoveWoodQuestion {
  readonly woods: readonly Wood[];
  readonly index: number;
  /** Tiles the wood fills. */
  readonly tiles: number;
}

/** Asks which wood takes the tiles of one that goes out; answers with its index, or with nothing. */
@Component({
  selector: 'sl-remove-wood-dialog',
  imports: [MatButton, MatDialogModule, WoodStrip],
  template: `
    <h2 mat-dialog-title>Take {{ name }} out</h2>
    <mat-dialog-content>
      <p>
        {{ tiles }} {{ question.tiles === 1 ? 'is' : 'are' }} laid in it. Which wood takes them?
      </p>
      <fieldset>
        <legend class="cdk-visually-hidden">Wood that takes the tiles</legend>
        @for (heir of heirs; track heir.index) {
          <label>
            <input
              type="radio"
              name="heir"
              [checked]="heir.index === chosen()"
              (change)="chosen.set(heir.index)"
            />
            <sl-wood-strip [colour]="heir.wood.colour" [figure]="heir.figure" />
            {{ heir.wood.name }}
          </label>
        }
      </fieldset>
    </mat-dialog-content>
    <mat-dialog-actions align="end">
      <button matButton type="button" mat-dialog-close>Keep it</button>
      <button matButton="filled" type="button" [mat-dialog-close]="chosen()">Take it out</button>
    </mat-dialog-actions>
  `,
  styles: `
    p {
      margin: 0 0 12px;
    }
    fieldset {
      display: grid;
      gap: 4px;
      margin: 0;
      padding: 0;
      border: 0;
    }
    label {
      display: flex;
      align-items: center;
      gap: 12px;
      min-height: 40px;
      padding: 0 10px;
      border-radius: 10px;
      cursor: pointer;
    }
    label:has(:checked) {
      background: var(--pale-blue);
    }
    input {
      width: 18px;
      height: 18px;
      accent-color: var(--blue);
    }
    sl-wood-strip {
      width: 44px;
      height: 26px;
      border-radius: 6px;
    }
  `,
})
export class RemoveWoodDialog {
  protected readonly question = inject<RemoveWoodQuestion>(MAT_DIALOG_DATA);
  private readonly figures = figuresOf(this.question.woods);
  protected readonly name = this.question.woods[this.question.index]?.name ?? 'the wood';
  protected readonly tiles = tilesWords(this.question.tiles);
  protected readonly heirs = this.question.woods.flatMap((wood, index) => {
    const figure = this.figures[index];
    return index === this.question.index || !figure ? [] : [{ index, wood, figure }];
  });
  protected readonly chosen = signal(this.heirs[0]?.index ?? 0);
}
