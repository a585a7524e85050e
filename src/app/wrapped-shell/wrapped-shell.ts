import {
  afterNextRender,
  Component,
  computed,
  DestroyRef,
  DOCUMENT,
  effect,
  type ElementRef,
  inject,
  input,
  signal,
  viewChild,
} from '@angular/core';
import { tileName } from '@shared/layout/cells';
import type { Layout } from '@shared/layout/schema';
import { ShellDrawing } from './shell-drawing';
import type { ShellScene } from './shell-scene';

/**
 * The shell as it will be after turning, to be turned with drag, arrow keys or touch. Follows every tile
 * laid. Where the browser has no WebGL a drawing stands in its place.
 */
@Component({
  selector: 'sl-wrapped-shell',
  imports: [ShellDrawing],
  templateUrl: './wrapped-shell.html',
  styleUrl: './wrapped-shell.scss',
})
export class WrappedShell {
  readonly layout = input.required<Layout>();

  private readonly document = inject(DOCUMENT);
  private readonly canvas = viewChild<ElementRef<HTMLCanvasElement>>('canvas');
  private readonly scene = signal<ShellScene | null>(null);
  private shown: Layout | null = null;
  protected readonly flat = signal(false);
  protected readonly facing = signal(0);
  protected readonly label = computed(() => {
    const { shell, woods, name } = this.layout();
    const names = woods.map((wood) => wood.name).join(', ');
    return `${name}: round shell of ${shell.staves} staves and ${shell.courses} courses in ${names}.`;
  });
  protected readonly position = computed(() => `Facing you: ${tileName(this.facing(), 0)} upwards`);

  constructor() {
    const destroyed = inject(DestroyRef);
    let gone = false;
    destroyed.onDestroy(() => {
      gone = true;
      this.scene()?.dispose();
    });
    afterNextRender(() => {
      void this.start().then((scene) => {
        if (gone) scene?.dispose();
        else this.scene.set(scene);
      });
    });
    effect(() => this.follow());
  }

  /** A PNG of the present view, 2000 pixels wide; null where there is no WebGL. */
  async picture(): Promise<Blob | null> {
    return (await this.scene()?.picture('#F4F1EA')) ?? null;
  }

  protected onKey(event: KeyboardEvent): void {
    const turn = KEYS[event.key];
    if (!turn) return;
    event.preventDefault();
    this.scene()?.turn(turn.steps, turn.tips);
    this.readFacing();
  }

  private async start(): Promise<ShellScene | null> {
    const canvas = this.canvas()?.nativeElement;
    const window = this.document.defaultView;
    if (!canvas || !window) return null;
    try {
      const { ShellScene } = await import('./shell-scene');
      const scene = new ShellScene(canvas, window, () => this.readFacing());
      const place = new ResizeObserver(() => scene.resize(canvas.clientWidth, canvas.clientHeight));
      place.observe(canvas);
      return scene;
    } catch {
      // no WebGL, or the graphics chip refused: the drawing says the same without depth
      this.flat.set(true);
      return null;
    }
  }

  private follow(): void {
    const scene = this.scene();
    const layout = this.layout();
    if (!scene) return;
    const before = this.shown;
    this.shown = layout;
    if (!before || !sameTiles(before, layout)) {
      scene.show(layout, layout.cells);
      this.readFacing();
      return;
    }
    const laid: number[] = [];
    layout.cells.forEach((wood, p) => {
      if (before.cells[p] !== wood) laid.push(p);
    });
    if (laid.length > 0) scene.follow(layout.cells, laid);
  }

  private readFacing(): void {
    this.facing.set(this.scene()?.facingStave(this.layout().shell.staves) ?? 0);
  }
}

const KEYS: Readonly<Record<string, { readonly steps: number; readonly tips: number }>> = {
  ArrowLeft: { steps: -1, tips: 0 },
  ArrowRight: { steps: 1, tips: 0 },
  ArrowUp: { steps: 0, tips: 1 },
  ArrowDown: { steps: 0, tips: -1 },
};

/** True when only the woods of tiles differ. */
function sameTiles(a: Layout, b: Layout): boolean {
  return a.shell === b.shell && a.joint === b.joint && a.woods === b.woods;
}
