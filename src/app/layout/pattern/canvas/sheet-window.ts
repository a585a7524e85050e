/** The window over the sheet: keeps where it looks within bounds and tells its owner when that changes. */
import { roundStave } from '@shared/layout/cells';
import type { Tile } from '@shared/layout/extent';
import type { PointMm } from '@shared/units/length';
import { INSETS } from './overlay-painting';
import type { SheetDrawing } from './sheet-drawing';
import {
  panned,
  scaleOfHeight,
  scaleOfWhole,
  showing,
  toPattern,
  turnedTo,
  viewFromSeam,
  viewOfWhole,
  zoomedAt,
  type PointPx,
  type SizePx,
  type ViewBounds,
  type Viewport,
} from './viewport';

/** Side of a tile at first, if the shell leaves the choice; and the greatest. */
const FIRST_TILE_PX = 52;
const LARGEST_TILE_PX = 240;

type Measured = Pick<SheetDrawing, 'grid' | 'size' | 'tileWidth' | 'tileHeight'>;

interface Looking {
  readonly drawing: Measured;
  readonly bounds: ViewBounds;
  readonly view: Viewport;
}

export class SheetWindow {
  private looking: Looking | null = null;

  constructor(private readonly looked: (view: Viewport) => void) {}

  /** Looks at a sheet through a window of this size; the same sheet stays where it was. */
  fit(drawing: Measured, size: SizePx): void {
    if (size.width === 0 || size.height === 0) return;
    const bounds = boundsOf(drawing, size);
    const { looking } = this;
    if (looking && sameSheet(looking.drawing, drawing) && !showsWhole(looking)) {
      this.turn({ drawing, bounds, view: panned(looking.view, bounds, 0, 0) });
    } else {
      this.turn({ drawing, bounds, view: firstView(drawing, bounds) });
    }
  }

  zoom(factor: number, about: PointPx = this.middle()): void {
    this.change(({ view, bounds }) => zoomedAt(view, bounds, about, factor));
  }

  pan(dx: number, dy: number): void {
    this.change(({ view, bounds }) => panned(view, bounds, dx, dy));
  }

  showWhole(): void {
    this.change(({ bounds }) => viewOfWhole(bounds));
  }

  /** Turns the shell until a place, counted in staves from the seam, is in the middle. */
  turnTo(staves: number): void {
    this.change(({ view, bounds, drawing }) => turnedTo(view, bounds, staves * drawing.tileWidth));
  }

  /** Moves as little as it must to show a tile. */
  showTile({ stave, course }: Tile): void {
    this.change(({ view, bounds, drawing: { tileWidth, tileHeight } }) =>
      showing(view, bounds, {
        x: stave * tileWidth,
        y: course * tileHeight,
        width: tileWidth,
        height: tileHeight,
      }),
    );
  }

  /** The pattern point under a point of the window; null before there is a sheet. */
  pointAt(point: PointPx): PointMm | null {
    return this.looking && toPattern(this.looking.view, point);
  }

  /** The tile in the middle of the window, or the nearest to it. */
  tileInMiddle(): Tile | null {
    const point = this.pointAt(this.middle());
    if (!point || !this.looking) return null;
    const { grid, tileWidth, tileHeight } = this.looking.drawing;
    const course = Math.floor(point.y / tileHeight);
    return {
      stave: roundStave(grid, Math.floor(point.x / tileWidth)),
      course: Math.min(Math.max(course, 0), grid.courses - 1),
    };
  }

  private middle(): PointPx {
    const { width, height } = this.looking?.bounds.size ?? { width: 0, height: 0 };
    return { x: width / 2, y: height / 2 };
  }

  private change(next: (looking: Looking) => Viewport): void {
    if (this.looking) this.turn({ ...this.looking, view: next(this.looking) });
  }

  private turn(looking: Looking): void {
    this.looking = looking;
    this.looked(looking.view);
  }
}

function boundsOf({ size: sheet, tileWidth, tileHeight }: Measured, size: SizePx): ViewBounds {
  return {
    size,
    sheet,
    insets: INSETS,
    leastPxPerMm: scaleOfWhole(size, sheet, INSETS),
    mostPxPerMm: LARGEST_TILE_PX / Math.min(tileWidth, tileHeight),
  };
}

/** The height of the shell when its tiles stay comfortable, from the seam; a large shell as a whole. */
function firstView({ tileWidth, tileHeight }: Measured, bounds: ViewBounds): Viewport {
  const comfortable = FIRST_TILE_PX / Math.min(tileWidth, tileHeight);
  const scale = Math.min(comfortable, scaleOfHeight(bounds.size, bounds.sheet, INSETS));
  return scale <= bounds.leastPxPerMm ? viewOfWhole(bounds) : viewFromSeam(bounds, scale);
}

function sameSheet(a: Measured, b: Measured): boolean {
  return (
    a.grid.staves === b.grid.staves &&
    a.grid.courses === b.grid.courses &&
    a.tileWidth === b.tileWidth &&
    a.tileHeight === b.tileHeight
  );
}

function showsWhole({ view, bounds }: Looking): boolean {
  return view.pxPerMm === bounds.leastPxPerMm;
}
