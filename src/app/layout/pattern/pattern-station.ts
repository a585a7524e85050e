import { BreakpointObserver } from '@angular/cdk/layout';
import { Component, computed, effect, inject, signal, untracked, viewChild } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { MatButton } from '@angular/material/button';
import { MatDialog } from '@angular/material/dialog';
import { countWoods, roundStave, tileName, type Grid } from '@shared/layout/cells';
import { printCopiedPatch, readCopiedPatch } from '@shared/layout/copied-patch';
import type { Tile } from '@shared/layout/extent';
import { addWood, editWood, removeWood, type WoodWords } from '@shared/layout/wood-changes';
import { ringOf } from '@shared/shell/ring';
import { formatAngle, formatLength } from '@shared/units/format';
import { map } from 'rxjs';
import { groundOf, initialsOf } from '../../drawing/avatar';
import { Icon } from '../../drawing/icon';
import { Announcer } from '../../platform/announcer';
import { LayoutStore } from '../layout-store';
import { LiveEvents } from '../live-events';
import type { PersonMark } from './canvas/overlay-painting';
import { PatternCanvas } from './canvas/pattern-canvas';
import type { ViewSpan } from './canvas/view-span';
import { KeysDialog } from './keys/keys-dialog';
import { PatternHand } from './pattern-hand';
import { PatternTool } from './pattern-tool';
import { RoundPanel } from './round/round-panel';
import { SentenceBar } from './sentence-bar/sentence-bar';
import { inSentence } from './sentence-words';
import { PatternSide } from './side/pattern-side';
import { overlaidWords, tileWords } from './spoken';
import { WholePattern } from './whole/whole-pattern';
import { RemoveWoodDialog, type RemoveWoodQuestion } from './wood-tray/remove-wood-dialog';
import { WoodDialog, type WoodQuestion } from './wood-tray/wood-dialog';
import { WoodTray } from './wood-tray/wood-tray';

/** From this width up tiles are laid, a 1440 px window at 200 % zoom included; below it the pattern is looked at. */
const LAYING_FROM = '(min-width: 700px)';

/** The pattern: the unrolled shell, the sentence that says what a touch does, the woods, and what it comes to. */
@Component({
  selector: 'sl-pattern-station',
  imports: [
    Icon,
    MatButton,
    PatternCanvas,
    PatternSide,
    RoundPanel,
    SentenceBar,
    WholePattern,
    WoodTray,
  ],
  providers: [PatternTool, PatternHand],
  templateUrl: './pattern-station.html',
  styleUrl: './pattern-station.scss',
  host: {
    '(document:keydown)': 'pick($event)',
    '(document:copy)': 'copy($event)',
    '(document:paste)': 'paste($event)',
  },
})
export class PatternStation {
  protected readonly store = inject(LayoutStore);
  protected readonly tool = inject(PatternTool);
  protected readonly hand = inject(PatternHand);
  private readonly dialogs = inject(MatDialog);
  private readonly announcer = inject(Announcer);
  protected readonly canvas = viewChild.required(PatternCanvas);

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
  protected readonly preview = computed(() => (this.mode() === 'lay' ? this.hand.reached() : []));
  protected readonly hint = computed(() => {
    if (this.mode() !== 'lay') {
      return 'Drag to turn the shell; Ctrl and the wheel, or two fingers, come nearer.';
    }
    return (
      this.hand.words() ??
      'Drag with Space or the middle button, or with two fingers, to turn the shell.'
    );
  });
  protected readonly label = computed(() => {
    const { staves, courses } = this.store.grid();
    const hand =
      this.mode() === 'lay'
        ? 'Arrow keys walk the tiles, Space lays, P marks the corner of a patch, Escape stops.'
        : '';
    return `Pattern, ${staves} staves by ${courses} courses. ${hand} Plus and minus zoom, Shift with arrows moves the view, the question mark lists all keys.`;
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
    const overlaid = computed(() => this.store.overlaidByMine().size);
    effect(() => {
      const count = overlaid();
      if (count > 0) untracked(() => this.announcer.tell(overlaidWords(count)));
    });
    const live = inject(LiveEvents);
    effect(() => {
      const tile = this.hand.at();
      const stave = tile && roundStave(this.store.grid(), tile.stave);
      untracked(() => live.moveTo({ tile: tile && { stave: stave ?? 0, course: tile.course } }));
    });
  }

  protected cancel(): void {
    this.hand.cancel();
    this.announcer.speak('The stroke is taken back.');
  }

  protected walk(tile: Tile | null): void {
    this.hand.walk(tile);
    if (!tile) {
      this.announcer.speak('Stopped.');
      return;
    }
    const comesTo = this.mode() === 'lay' ? ` ${this.hand.words() ?? ''}` : '';
    this.announcer.speak(tileWords(this.store.layout(), tile) + comesTo);
  }

  protected mark(tile: Tile): void {
    this.hand.mark(tile);
    const corner = tileName(tile.stave, tile.course);
    this.announcer.speak(`Corner at ${corner}. Arrow keys draw the patch out, Space takes it.`);
  }

  /** Ctrl C: the patch the keyboard has drawn out, or the tile it stands on. */
  protected copy(event: ClipboardEvent): void {
    if (this.busyElsewhere(event) || !getSelection()?.isCollapsed) return;
    const patch = this.hand.copyStanding() ? this.tool.copied() : null;
    if (!patch) return;
    event.clipboardData?.setData('text/plain', printCopiedPatch(patch));
    event.preventDefault();
  }

  /** Ctrl V: a patch from the clipboard, or else the one copied last in this browser. */
  protected paste(event: ClipboardEvent): void {
    if (this.mode() !== 'lay' || this.busyElsewhere(event)) return;
    const clipboard = event.clipboardData;
    if (clipboard && clipboard.files.length > 0) return;
    const patch = readCopiedPatch(clipboard?.getData('text/plain') ?? '') ?? this.tool.copied();
    if (patch) this.hand.paste(patch);
    else this.announcer.tell('There is no copied patch. Stand on a tile and press Ctrl C first.');
  }

  protected showKeys(): void {
    this.dialogs.open(KeysDialog, { width: '560px' });
  }

  /** The number keys take a wood into the hand: 1 to 9, and 0 for the tenth. */
  protected pick(event: KeyboardEvent): void {
    if (event.ctrlKey || event.metaKey || event.altKey || this.busyElsewhere(event)) return;
    if (event.key === '?') this.showKeys();
    if (this.mode() !== 'lay' || !/^\d$/.test(event.key)) return;
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

  private busyElsewhere({ target }: Event): boolean {
    return isEntry(target) || this.dialogs.openDialogs.length > 0;
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
