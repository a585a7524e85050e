import { Component, computed, inject, linkedSignal, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatDialog } from '@angular/material/dialog';
import { relayChange } from '@shared/layout/patch';
import { swapWoods, turnedCells } from '@shared/layout/pattern-moves';
import type { PatternKind } from '@shared/layout/starting-patterns/starting-pattern';
import { CountField } from '../../../drawing/count-field';
import { Announcer } from '../../../platform/announcer';
import { LayoutStore } from '../../layout-store';
import { FromPicture } from '../from-picture/from-picture';
import { PatternTool } from '../pattern-tool';
import { woodOptions } from '../sentence-bar/wood-options';
import { WordChoice } from '../sentence-bar/word-choice';
import { counted } from '../sentence-words';
import {
  StartingPatternsDialog,
  type StartingPatternsQuestion,
} from '../starting-patterns/starting-patterns-dialog';

type Way = 'left' | 'right';
const KEYS: Partial<Record<string, Way>> = { '[': 'left', ']': 'right' };

/** What is done to the whole pattern at once, each as one step to undo: laid by name, turned, woods swapped. */
@Component({
  selector: 'sl-whole-pattern',
  imports: [CountField, FromPicture, MatButton, WordChoice],
  templateUrl: './whole-pattern.html',
  styleUrl: './whole-pattern.scss',
  host: { '(document:keydown)': 'press($event)' },
})
export class WholePattern {
  private readonly store = inject(LayoutStore);
  private readonly tool = inject(PatternTool);
  private readonly dialogs = inject(MatDialog);
  private readonly announcer = inject(Announcer);

  protected readonly woods = computed(() => woodOptions(this.store.woods()));
  protected readonly mostStaves = computed(() => this.store.grid().staves - 1);
  protected readonly by = linkedSignal<number, number>({
    source: this.mostStaves,
    computation: (most, before) => Math.min(before?.value ?? 1, most),
  });
  private readonly wishedOne = signal(0);
  private readonly wishedOther = signal(1);
  protected readonly one = computed(() => this.present(this.wishedOne()));
  protected readonly other = computed(() => this.present(this.wishedOther()));

  protected swapOne(wood: number): void {
    this.wishedOne.set(wood);
  }

  protected swapOther(wood: number): void {
    this.wishedOther.set(wood);
  }

  protected start(): void {
    const data = { store: this.store, accent: this.tool.wood() };
    this.dialogs
      .open<StartingPatternsDialog, StartingPatternsQuestion, PatternKind>(StartingPatternsDialog, {
        data,
        width: '1060px',
        maxWidth: '96vw',
      })
      .afterClosed()
      .subscribe((laid) => {
        if (laid) this.announcer.offer('The pattern is laid.', 'Undo', () => this.store.undo());
      });
  }

  /** The keys [ and ] turn the pattern, except where something is written or a question is open. */
  protected press(event: KeyboardEvent): void {
    const way = KEYS[event.key];
    // on many keyboards the brackets need AltGr, which comes with Ctrl on some systems
    const commanded = event.ctrlKey || event.metaKey;
    if (!way || (commanded && !event.getModifierState('AltGraph'))) return;
    if (this.dialogs.openDialogs.length > 0) return;
    if (event.target instanceof HTMLInputElement) return;
    this.turn(way);
  }

  protected turn(way: Way): void {
    if (this.store.gestureOpen()) return;
    const cells = this.store.cells();
    const by = way === 'right' ? this.by() : -this.by();
    const change = relayChange(cells, turnedCells(this.store.grid(), cells, by));
    const words = counted(this.by(), 'stave');
    this.store.edit(`Turn the pattern ${words} to the ${way}`, change);
    this.announcer.speak(
      change
        ? `The pattern is turned ${words} to the ${way}.`
        : `Turned ${words} the pattern is the same.`,
    );
  }

  protected swap(): void {
    const [one, other] = [this.woods()[this.one()], this.woods()[this.other()]];
    const change = swapWoods(this.store.cells(), this.one(), this.other());
    if (!one || !other || !change) {
      this.announcer.tell('Neither of the two woods is laid: there is nothing to swap.');
      return;
    }
    this.store.edit(`Swap ${one.words} and ${other.words}`, change);
    this.announcer.speak(`${one.words} and ${other.words} are swapped.`);
  }

  private present(wood: number): number {
    return Math.min(wood, this.store.woods().length - 1);
  }
}
