import { BreakpointObserver } from '@angular/cdk/layout';
import {
  Component,
  computed,
  DestroyRef,
  effect,
  inject,
  signal,
  untracked,
  viewChild,
} from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { MatButton } from '@angular/material/button';
import { MatDialog } from '@angular/material/dialog';
import { countWoods, roundStave, type Grid } from '@shared/layout/cells';
import type { Tile } from '@shared/layout/extent';
import { layChange } from '@shared/layout/patch';
import { addWood, editWood, removeWood, type WoodWords } from '@shared/layout/wood-changes';
import { ringOf } from '@shared/shell/ring';
import { formatAngle, formatLength } from '@shared/units/format';
import { map } from 'rxjs';
import { groundOf, initialsOf } from '../../drawing/avatar';
import { Icon } from '../../drawing/icon';
import { Announcer } from '../../platform/announcer';
import { LayoutStore, type Gesture } from '../layout-store';
import { LiveEvents } from '../live-events';
import type { PersonMark } from './canvas/overlay-painting';
import { PatternCanvas } from './canvas/pattern-canvas';
import type { ViewSpan } from './canvas/view-span';
import { PatternTool } from './pattern-tool';
import { RoundPanel } from './round/round-panel';
import { SentenceBar } from './sentence-bar/sentence-bar';
import { inSentence } from './sentence-words';
import { PatternSide } from './side/pattern-side';
import { laidWords, tileWords } from './spoken';
import { RemoveWoodDialog, type RemoveWoodQuestion } from './wood-tray/remove-wood-dialog';
import { WoodDialog, type WoodQuestion } from './wood-tray/wood-dialog';
import { WoodTray } from './wood-tray/wood-tray';

/** From this width up tiles are laid; below it the pattern is looked at. */
const LAYING_FROM = '(min-width: 768px)';

/** The pattern: the unrolled shell, the sentence that says what a touch does, the woods, and what it comes to. */
@Component({
  selector: 'sl-pattern-station',
  imports: [Icon, MatButton, PatternCanvas, PatternSide, RoundPanel, SentenceBar, WoodTray],
  providers: [PatternTool],
  templateUrl: './pattern-station.html',
  styleUrl: './pattern-station.scss',
  host: { '(document:keydown)': 'pick($event)' },
})
export class PatternStation {
  protected readonly store = inject(LayoutStore);
  protected readonly tool = inject(PatternTool);
  private readonly dialogs = inject(MatDialog);
  private readonly announcer = inject(Announcer);
  protected readonly canvas = viewChild.required(PatternCanvas);
  private gesture: Gesture | null = null;

  private readonly wide = toSignal(
    inject(BreakpointObserver)
      .observe(LAYING_FROM)
      .pipe(map(({ matches }) => matches)),
    { initialValue: true },
  );
  protected readonly numbers = signal<'shown' | 'hidden'>('hidden');
  protected readonly round = signal<'shown' | 'hidden'>('hidden');
  /** Where others are on the pattern. */
  protected readonly others = computed<readonly PersonMark[]>(() =>
    this.store.people().flatMap(({ tile, person: { name } }) => {
      if (!tile || !isOnGrid(this.store.grid(), tile)) return [];
      return [{ tile, initials: initialsOf(name), colour: groundOf(name) }];
    }),
  );
  protected readonly span = signal<ViewSpan | null>(null);
  private readonly pointedAt = signal<Tile | null>(null);
  private readonly standsOn = signal<Tile | null>(null);

  /** Why nothing can be laid here, or null. */
  protected readonly locked = computed(() => {
    if (this.store.opened()?.commission.archived) {
      return 'The commission is archived: the pattern can be looked at, not changed.';
    }
    if (!this.store.rights.editPattern()) {
      return 'You can look at the pattern. Owners and designers lay tiles.';
    }
    return this.wide() ? null : 'To lay tiles, open the pattern on a wider screen.';
  });
  protected readonly mode = computed(() => (this.locked() === null ? 'lay' : 'look'));
  protected readonly preview = computed<readonly number[]>(() => {
    const tile = this.standsOn() ?? this.pointedAt();
    return tile && this.mode() === 'lay' ? [...this.tool.positionsFor([tile])] : [];
  });
  protected readonly hint = computed(() =>
    this.mode() === 'lay'
      ? 'Drag with Space or the middle button, or with two fingers, to turn the shell.'
      : 'Drag to turn the shell; Ctrl and the wheel, or two fingers, come nearer.',
  );
  protected readonly label = computed(() => {
    const { staves, courses } = this.store.grid();
    const hand =
      this.mode() === 'lay' ? 'Arrow keys walk the tiles, Space lays, Escape stops.' : '';
    return `Pattern, ${staves} staves by ${courses} courses. ${hand} Plus and minus zoom, Shift with arrows moves the view.`;
  });
  protected readonly sizes = computed(() => {
    const { shell, lengthUnit } = this.store.layout();
    const ring = ringOf(shell, this.store.layout().joint.staveJoint.reach);
    return (
      `${shell.staves} staves × ${shell.courses} courses · ${formatLength(shell.tileWidth, lengthUnit)} tile\n` +
      `${formatLength(ring.acrossFlats, lengthUnit)} across the flats · bevel ${formatAngle(ring.bevel)}`
    );
  });

  constructor() {
    // Whoever leaves in the middle of a stroke keeps what it has laid.
    inject(DestroyRef).onDestroy(() => this.end());
    const live = inject(LiveEvents);
    effect(() => {
      const tile = this.standsOn() ?? this.pointedAt();
      const stave = tile && roundStave(this.store.grid(), tile.stave);
      untracked(() => live.moveTo({ tile: tile && { stave: stave ?? 0, course: tile.course } }));
    });
  }

  protected begin(): void {
    this.gesture = this.store.begin(`Lay ${this.tool.woodName()}`);
  }

  protected meet(tiles: readonly Tile[]): void {
    const positions = this.tool.positionsFor(tiles);
    this.gesture?.apply(layChange(this.store.cells(), positions, this.tool.wood()));
  }

  protected end(): void {
    this.gesture?.finish();
    this.gesture = null;
  }

  protected cancel(): void {
    this.gesture?.cancel();
    this.gesture = null;
    this.announcer.speak('The stroke is taken back.');
  }

  protected point(tile: Tile | null): void {
    this.pointedAt.set(tile);
  }

  protected walk(tile: Tile | null): void {
    this.standsOn.set(tile);
    this.announcer.speak(tile ? tileWords(this.store.layout(), tile) : 'Stopped.');
  }

  protected layByKey(tile: Tile): void {
    const positions = this.tool.positionsFor([tile]);
    const change = layChange(this.store.cells(), positions, this.tool.wood());
    this.store.edit(`Lay ${this.tool.woodName()}`, change);
    this.announcer.speak(laidWords(tile, change?.positions.length ?? 0, this.tool.woodName()));
  }

  /** The number keys take a wood into the hand: 1 to 9, and 0 for the tenth. */
  protected pick(event: KeyboardEvent): void {
    if (event.ctrlKey || event.metaKey || event.altKey || this.mode() !== 'lay') return;
    if (!/^\d$/.test(event.key) || isEntry(event.target) || this.dialogs.openDialogs.length > 0) {
      return;
    }
    const index = (Number(event.key) + 9) % 10;
    const wood = this.store.woods()[index];
    if (!wood) return;
    this.tool.wood.set(index);
    this.announcer.speak(`${wood.name} in the hand.`);
  }

  protected addWood(): void {
    this.askWood({ wood: null }, (words) => {
      this.store.edit(`Add ${inSentence(words.name)}`, ...addWood(this.store.layout(), words));
      this.tool.wood.set(this.store.woods().length - 1);
    });
  }

  protected editWood(index: number): void {
    const wood = this.store.woods()[index];
    if (!wood) return;
    this.askWood({ wood }, (words) => {
      const now = this.store.woods().findIndex(({ key }) => key === wood.key);
      const changes = now < 0 ? [] : editWood(this.store.layout(), now, words);
      this.store.edit(`Change ${inSentence(wood.name)}`, ...changes);
    });
  }

  protected removeWood(index: number): void {
    const layout = this.store.layout();
    const { woods, cells } = layout;
    const tiles = countWoods(cells, woods.length)[index] ?? 0;
    const key = woods[index]?.key;
    if (tiles === 0) {
      this.takeOut(key, woods[index === 0 ? 1 : 0]?.key);
      return;
    }
    const data: RemoveWoodQuestion = { woods, index, tiles };
    this.dialogs
      .open<RemoveWoodDialog, RemoveWoodQuestion, number>(RemoveWoodDialog, {
        data,
        width: '440px',
      })
      .afterClosed()
      .subscribe((heir) => {
        if (heir !== undefined) this.takeOut(key, woods[heir]?.key);
      });
  }

  /** By keys: while the question was open somebody else may have changed the list. */
  private takeOut(key: string | undefined, heirKey: string | undefined): void {
    const layout = this.store.layout();
    const index = layout.woods.findIndex((wood) => wood.key === key);
    const heir = layout.woods.findIndex((wood) => wood.key === heirKey);
    const wood = layout.woods[index];
    if (!wood || heir < 0) return;
    this.store.edit(`Take out ${inSentence(wood.name)}`, ...removeWood(layout, index, heir));
    this.announcer.offer(`${wood.name} is taken out.`, 'Undo', () => this.store.undo());
  }

  private askWood(data: WoodQuestion, take: (words: WoodWords) => void): void {
    this.dialogs
      .open<WoodDialog, WoodQuestion, WoodWords>(WoodDialog, { data, width: '460px' })
      .afterClosed()
      .subscribe((words) => {
        if (words) take(words);
      });
  }
}

function isEntry(target: EventTarget | null): boolean {
  return (
    target instanceof HTMLInputElement ||
    target instanceof HTMLTextAreaElement ||
    (target instanceof HTMLElement && target.closest('[role="menu"]') !== null)
  );
}

/** Somebody may still point at a tile that a smaller grid no longer has. */
function isOnGrid(grid: Grid, tile: Tile): boolean {
  return tile.stave < grid.staves && tile.course < grid.courses;
}
