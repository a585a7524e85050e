import { Component, computed, DestroyRef, effect, inject, signal, untracked } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MAT_DIALOG_DATA, MatDialogModule, MatDialogRef } from '@angular/material/dialog';
import { relayChange } from '@shared/layout/patch';
import { patternProblems } from '@shared/layout/starting-patterns/bounds';
import { firstPatterns } from '@shared/layout/starting-patterns/first-pattern';
import {
  PATTERN_KINDS,
  type PatternKind,
  type StartingPattern,
} from '@shared/layout/starting-patterns/starting-pattern';
import { ChoiceBar } from '../../../drawing/choice-bar';
import { FigureText } from '../../../drawing/figure-text';
import { Lamp } from '../../../drawing/lamp';
import { PatternSketch } from '../../../drawing/pattern-sketch';
import type { LayoutStore } from '../../layout-store';
import { woodOptions } from '../sentence-bar/wood-options';
import { tilesWords } from '../sentence-words';
import { CheckerFields } from './checker-fields';
import { DiamondFields } from './diamond-fields';
import { HelixFields } from './helix-fields';
import { PatternLaying } from './pattern-laying';
import { ScatterFields } from './scatter-fields';
import { KIND_WORDS, offerWords, seamSentence, withOffer } from './seam-words';
import { StripeFields } from './stripe-fields';
import { ZigzagFields } from './zigzag-fields';

export interface StartingPatternsQuestion {
  readonly store: LayoutStore;
  /** The wood that stands out first: the one in the hand. */
  readonly accent: number;
}

/** A whole pattern by name and parameters, seen before it is laid; laying it is one step to undo. */
@Component({
  selector: 'sl-starting-patterns-dialog',
  imports: [
    CheckerFields,
    ChoiceBar,
    DiamondFields,
    FigureText,
    HelixFields,
    Lamp,
    MatButton,
    MatDialogModule,
    PatternSketch,
    ScatterFields,
    StripeFields,
    ZigzagFields,
  ],
  templateUrl: './starting-patterns-dialog.html',
  styleUrl: './starting-patterns-dialog.scss',
})
export class StartingPatternsDialog {
  private readonly question = inject<StartingPatternsQuestion>(MAT_DIALOG_DATA);
  private readonly store = this.question.store;
  private readonly dialog = inject<MatDialogRef<StartingPatternsDialog, PatternKind>>(MatDialogRef);
  private readonly laying = new PatternLaying();

  protected readonly kinds = PATTERN_KINDS.map((value) => ({ value, label: KIND_WORDS[value] }));
  protected readonly kind = signal<PatternKind>('checker');
  protected readonly patterns = signal(
    firstPatterns(this.store.grid(), this.question.accent === 0 ? 1 : 0, this.question.accent),
  );
  protected readonly pattern = computed<StartingPattern>(() => this.patterns()[this.kind()]);
  protected readonly woods = computed(() => woodOptions(this.store.woods()));
  protected readonly colours = computed(() => this.store.woods().map(({ colour }) => colour));
  protected readonly proportion = computed(() => {
    const { tileWidth, tileHeight } = this.store.soundLayout().shell;
    return tileHeight / tileWidth;
  });

  /** Why the pattern cannot be laid as it is, or null. */
  protected readonly problem = computed(() => {
    const [first] = patternProblems(this.pattern(), this.store.woods().length);
    if (!first) return null;
    return first.field === 'shares'
      ? 'Give at least one wood a share above 0.'
      : `${first.field}: ${first.message}.`;
  });
  protected readonly busy = this.laying.busy;
  protected readonly working = computed(
    () => `Scattering ${tilesWords(this.store.grid().staves * this.store.grid().courses)}…`,
  );
  protected readonly shown = computed(() => {
    const laid = this.laying.laid();
    if (!laid) return null;
    const { grid, pattern } = laid;
    const offers = laid.laid.meets ? [] : laid.laid.offers;
    return {
      state: laid.laid.meets ? ('clear' as const) : ('caution' as const),
      sentence: seamSentence(laid),
      offers: offers.map((value) => ({ value, words: offerWords(pattern, value) })),
      cells: { ...grid, cells: laid.laid.cells },
      label: `${KIND_WORDS[pattern.kind]} on ${grid.staves} staves and ${grid.courses} courses, and once more beyond the seam`,
    };
  });
  protected readonly layWords = computed(() =>
    this.shown()?.state === 'caution' ? 'Lay anyway' : 'Lay it',
  );

  constructor() {
    inject(DestroyRef).onDestroy(() => this.laying.stop());
    effect(() => {
      const wish = { pattern: this.pattern(), grid: this.store.grid() };
      if (this.problem() === null) untracked(() => this.laying.lay(wish));
    });
  }

  protected set(pattern: StartingPattern): void {
    this.patterns.update((patterns) => ({ ...patterns, [pattern.kind]: pattern }));
  }

  protected takeOffer(offer: number): void {
    this.set(withOffer(this.pattern(), offer));
  }

  protected lay(): void {
    const cells = this.shown()?.cells.cells;
    if (!cells || cells.length !== this.store.cells().length) return;
    const kind = this.kind();
    const label = `Lay the ${KIND_WORDS[kind].toLowerCase()}`;
    this.store.edit(label, relayChange(this.store.cells(), cells));
    this.dialog.close(kind);
  }
}
