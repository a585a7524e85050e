import type { ElementRef, OutputEmitterRef } from '@angular/core';
import {
  afterNextRender,
  Component,
  computed,
  effect,
  inject,
  input,
  output,
  signal,
  untracked,
  viewChild,
  type OnDestroy,
} from '@angular/core';
import { cellAt, roundStave, type Grid } from '@shared/layout/cells';
import type { Tile } from '@shared/layout/extent';
import type { Layout } from '@shared/layout/schema';
import { trimOf } from '@shared/shell/trim';
import { formatLength } from '@shared/units/format';
import type { PointMm } from '@shared/units/length';
import { Theme } from '../../../platform/theme';
import { canvasKey, type CanvasKey } from './canvas-keys';
import type { PersonMark, TrimLines } from './overlay-painting';
import { PatternStage } from './pattern-stage';
import { PointerInput, type PointerMeaning } from './pointer-input';
import { differing, SceneBook } from './scene';
import { tilesBetween } from './stroke';
import { themeColours } from './theme-colours';
import type { NumbersShown, Scene } from './tile-painting';
import { viewSpan, type ViewSpan } from './view-span';
import { SheetWindow } from './sheet-window';
import type { PointPx, SizePx, Viewport } from './viewport';

const ZOOM_STEP = 1.35;
const PAN_STEP_PX = 120;

/**
 * The unrolled shell under the hand: shows a layout, says which tiles a stroke or the keyboard meets, and
 * changes nothing itself.
 */
@Component({
  selector: 'sl-pattern-canvas',
  template: `
    <div
      #surface
      class="surface"
      role="application"
      tabindex="0"
      [attr.aria-label]="label()"
      [attr.data-hand]="hand()"
      (keydown)="press($event)"
      (keyup)="release($event)"
      (blur)="panReady.set(false)"
    >
      <div #host class="host"></div>
    </div>
  `,
  styleUrl: './pattern-canvas.scss',
})
export class PatternCanvas implements OnDestroy {
  readonly layout = input.required<Layout>();
  readonly label = input.required<string>();
  readonly mode = input.required<'lay' | 'look'>();
  readonly numbers = input<NumbersShown>('hidden');
  /** Positions the next touch will change. */
  readonly preview = input<readonly number[]>([]);
  readonly overlaid = input<ReadonlySet<number>>(new Set());
  /** Where others are. */
  readonly people = input<readonly PersonMark[]>([]);

  readonly strokeBegan = output();
  /** Tiles the stroke has met since the last time; staves may lie beyond the seam. */
  readonly strokeMet = output<readonly Tile[]>();
  readonly strokeEnded = output();
  readonly strokeCancelled = output();
  readonly hovered = output<Tile | null>();
  /** Where the keyboard stands, or null when it has left. */
  readonly walked = output<Tile | null>();
  readonly laidByKey = output<Tile>();
  /** The corner of a patch, marked with the keyboard. */
  readonly marked = output<Tile>();
  readonly viewChanged = output<ViewSpan>();

  private readonly surface = viewChild.required<ElementRef<HTMLElement>>('surface');
  private readonly host = viewChild.required<ElementRef<HTMLDivElement>>('host');
  private readonly theme = inject(Theme);
  private readonly book = new SceneBook();
  private readonly stage = signal<PatternStage | null>(null);
  private readonly cursor = signal<Tile | null>(null);
  protected readonly panReady = signal(false);
  private readonly ended = new AbortController();
  private pointer: PointerInput | null = null;
  private resizes: ResizeObserver | null = null;
  private scene: Scene | null = null;
  private readonly window = new SheetWindow((view) => this.look(view));
  private strokeAt: PointMm | null = null;
  private hoveredCell = -1;

  protected readonly hand = computed(() =>
    this.mode() === 'look' || this.panReady() ? 'pan' : 'lay',
  );
  private readonly trim = computed<TrimLines | null>(() => {
    const { shell, lengthUnit } = this.layout();
    const { eachEnd, lower, upper } = trimOf(shell);
    if (eachEnd <= 0) return null;
    const words = `trimmed to ${formatLength(shell.finishedHeight, lengthUnit)} after glue-up`;
    return { bottom: lower, top: upper, words };
  });

  constructor() {
    afterNextRender(() => this.start());
    effect(() => {
      const layout = this.layout();
      const numbers = this.numbers();
      if (this.stage()) untracked(() => this.show(layout, numbers));
    });
    effect(() => {
      this.stage()?.setMarks({
        preview: this.preview(),
        cursor: this.cursor(),
        overlaid: this.overlaid(),
        people: this.people(),
        trim: this.trim(),
      });
    });
    effect(() => {
      this.theme.name();
      untracked(() => this.recolour());
    });
  }

  ngOnDestroy(): void {
    this.ended.abort();
    this.pointer?.destroy();
    this.resizes?.disconnect();
    this.stage()?.destroy();
  }

  zoomIn(): void {
    this.window.zoom(ZOOM_STEP);
  }

  zoomOut(): void {
    this.window.zoom(1 / ZOOM_STEP);
  }

  /** Shows the whole shell. */
  showWhole(): void {
    this.window.showWhole();
  }

  /** Turns the shell so that a place, counted in staves from the seam, is in the middle. */
  turnTo(staves: number): void {
    this.window.turnTo(staves);
  }

  /** Forgets the stroke under the hand: it has been taken back. */
  letGo(): void {
    this.pointer?.letGo();
    this.strokeAt = null;
    this.stage()?.strokeDone();
  }

  private start(): void {
    const surface = this.surface().nativeElement;
    const container = this.host().nativeElement;
    const size = sizeOf(surface);
    this.stage.set(new PatternStage({ container, size, colours: themeColours(container) }));
    this.pointer = new PointerInput(surface, this.meaning(), {
      pansOnly: () => this.hand() === 'pan',
    });
    this.resizes = new ResizeObserver(() => this.resize(sizeOf(surface)));
    this.resizes.observe(surface);
    matchMedia('(prefers-color-scheme: dark)').addEventListener('change', () => this.recolour(), {
      signal: this.ended.signal,
    });
    void document.fonts.ready.then(() => this.recolour());
  }

  private recolour(): void {
    this.stage()?.setColours(themeColours(this.host().nativeElement));
  }

  private resize(size: SizePx): void {
    const stage = this.stage();
    if (!stage || (size.width === stage.size.width && size.height === stage.size.height)) return;
    stage.resize(size);
    if (this.scene) this.window.fit(this.scene.drawing, size);
  }

  private show(layout: Layout, numbers: NumbersShown): void {
    const stage = this.stage();
    if (!stage) return;
    const before = this.scene;
    const { scene, change } = this.book.turnTo(layout, numbers);
    this.scene = scene;
    if (before && change === 'cells') {
      const positions = differing(before.cells, scene.cells);
      if (positions.length > 0) stage.lay(scene, positions);
      if (!this.strokeAt) stage.strokeDone();
      return;
    }
    stage.setScene(scene);
    if (before?.drawing !== scene.drawing) this.window.fit(scene.drawing, stage.size);
  }

  private look(view: Viewport): void {
    const stage = this.stage();
    if (!stage || !this.scene) return;
    stage.setView(view);
    this.viewChanged.emit(viewSpan(view, stage.size, this.scene.drawing));
  }

  private meaning(): PointerMeaning {
    return {
      hover: (point) => this.hover(point),
      strokeStart: (point) => this.beginStroke(point),
      strokeMove: (points) => this.moveStroke(points),
      strokeEnd: () => this.endStroke(),
      strokeCancel: () => {
        this.letGo();
        this.strokeCancelled.emit();
      },
      pan: (dx, dy) => this.window.pan(dx, dy),
      zoom: (factor, about) => this.window.zoom(factor, about),
    };
  }

  private hover(point: PointPx | null): void {
    const { scene } = this;
    if (!scene) return;
    this.stage()?.setFocus(point);
    const at = point && this.window.pointAt(point);
    const tile = at && scene.drawing.pick(at);
    const cell = tile ? cellAt(scene.drawing.grid, tile.stave, tile.course) : -1;
    if (cell === this.hoveredCell) return;
    this.hoveredCell = cell;
    if (tile) this.leave();
    this.hovered.emit(tile);
  }

  private beginStroke(point: PointPx): void {
    this.surface().nativeElement.focus({ preventScroll: true });
    this.leave();
    this.strokeAt = this.window.pointAt(point);
    this.strokeBegan.emit();
    this.moveStroke([point]);
  }

  private moveStroke(points: readonly PointPx[]): void {
    const { scene } = this;
    if (!scene || !this.strokeAt) return;
    const met: Tile[] = [];
    for (const point of points) {
      const to = this.window.pointAt(point);
      if (!to) continue;
      met.push(...tilesBetween(scene.drawing.pick, scene.drawing, this.strokeAt, to));
      this.strokeAt = to;
    }
    if (met.length > 0) this.strokeMet.emit(met);
  }

  private endStroke(): void {
    if (!this.strokeAt) return;
    this.strokeAt = null;
    this.strokeEnded.emit();
    this.stage()?.strokeDone();
  }

  protected press(event: KeyboardEvent): void {
    const key = canvasKey(event);
    if (key === null || (this.strokeAt && key.kind !== 'stop')) return;
    if (key.kind === 'space' && this.cursor() === null) this.panReady.set(true);
    else if (!this.act(key)) return;
    event.preventDefault();
  }

  protected release(event: KeyboardEvent): void {
    if (event.key === ' ') this.panReady.set(false);
  }

  /** Does what a key asks; false when it means nothing here. */
  private act(key: CanvasKey): boolean {
    switch (key.kind) {
      case 'walk':
        this.walk(key.staves, key.courses);
        return true;
      case 'pan':
        this.window.pan(-key.x * PAN_STEP_PX, -key.y * PAN_STEP_PX);
        return true;
      case 'space':
        return this.atCursor(this.laidByKey);
      case 'mark':
        return this.atCursor(this.marked);
      case 'stop':
        return this.stop();
      case 'zoom':
        this.window.zoom(key.direction === 'in' ? ZOOM_STEP : 1 / ZOOM_STEP);
        return true;
      case 'whole':
        this.showWhole();
        return true;
    }
  }

  private walk(staves: number, courses: number): void {
    const grid = this.scene?.drawing.grid;
    const from = this.cursor();
    const next = from && grid ? stepped(grid, from, staves, courses) : this.window.tileInMiddle();
    if (!next) return;
    this.cursor.set(next);
    this.window.showTile(next);
    this.walked.emit(next);
  }

  private atCursor(does: OutputEmitterRef<Tile>): boolean {
    const cursor = this.cursor();
    if (cursor === null || this.mode() !== 'lay') return false;
    does.emit(cursor);
    return true;
  }

  /** Esc: takes back the stroke under the hand, or else leaves the tiles. */
  private stop(): boolean {
    if (this.strokeAt) {
      this.letGo();
      this.strokeCancelled.emit();
      return true;
    }
    return this.leave();
  }

  private leave(): boolean {
    if (this.cursor() === null) return false;
    this.cursor.set(null);
    this.walked.emit(null);
    return true;
  }
}

/** The tile so many staves and courses on: round the seam, held at the ends. */
function stepped(grid: Grid, from: Tile, staves: number, courses: number): Tile {
  return {
    stave: roundStave(grid, from.stave + staves),
    course: Math.min(Math.max(from.course + courses, 0), grid.courses - 1),
  };
}

function sizeOf(element: HTMLElement): SizePx {
  return { width: element.clientWidth, height: element.clientHeight };
}
