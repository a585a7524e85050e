/**
 * The page the canvas bench opens in Chromium: the app's own canvas classes on one side, a bare canvas that
 * paints the same picture tile by tile on the other. Each drive moves something every frame and notes how
 * long its own script took and how far apart the frames were.
 */
import type { CanvasColours } from '../../src/app/layout/pattern/canvas/overlay-painting';
import { INSETS } from '../../src/app/layout/pattern/canvas/overlay-painting';
import { PatternStage } from '../../src/app/layout/pattern/canvas/pattern-stage';
import { SceneBook } from '../../src/app/layout/pattern/canvas/scene';
import { paintRange, type Scene } from '../../src/app/layout/pattern/canvas/tile-painting';
import {
  panned,
  viewOfWhole,
  zoomedAt,
  type ViewBounds,
  type Viewport,
} from '../../src/app/layout/pattern/canvas/viewport';
import type { CanvasBenchPage, DriveFigures } from './canvas-drives';
import { invertPatch, layChange, type CellsChange, type Change } from '@shared/layout/patch';
import { startingLayout } from '@shared/layout/starting-layout';

const COLOURS: CanvasColours = {
  paper: '#f4f1ea',
  ink: '#1e2a36',
  mute: '#5a6673',
  teal: '#0e8891',
  tealInk: '#0a6b73',
  stop: '#a2211a',
};

const WOODS = ['#DCC39A', '#5A3D2B', '#9A4B34', '#D9AE84'].map((colour, i) => ({
  key: `wood-${i}`,
  name: `Wood ${i + 1}`,
  colour,
  sawn: 'flat' as const,
}));

function sceneOf(staves: number, courses: number): Scene {
  const start = startingLayout('bench');
  const cells = Uint8Array.from({ length: staves * courses }, (_, i) => (i * 7 + (i % 13)) % 4);
  const layout = { ...start, shell: { ...start.shell, staves, courses }, woods: WOODS, cells };
  return new SceneBook().turnTo(layout, 'hidden').scene;
}

const size = { width: innerWidth, height: innerHeight };
let scene: Scene;
let view: Viewport;
let bounds: ViewBounds;
let stage: PatternStage | null = null;
let bare: HTMLCanvasElement | null = null;

const nextFrame = (): Promise<number> => new Promise((resolve) => requestAnimationFrame(resolve));

/** Takes a step every frame, before the stage's own frame callback, and measures all script of the frame. */
async function drive(frames: number, step: (frame: number) => void): Promise<DriveFigures> {
  const script: number[] = [];
  const gaps: number[] = [];
  let before = await nextFrame();
  for (let frame = 0; frame < frames; frame++) {
    const began = performance.now();
    step(frame);
    const stepped = performance.now() - began;
    const time = await nextFrame();
    const drawn = stage ? stage.lastFrameMs : 0;
    script.push(stepped + drawn);
    gaps.push(time - before);
    before = time;
  }
  return { script, frames: gaps };
}

async function settled(): Promise<void> {
  while (stage?.busy) await nextFrame();
}

function clearPage(): void {
  stage?.destroy();
  stage = null;
  bare?.remove();
  bare = null;
}

function paintBare(): void {
  const context = bare?.getContext('2d');
  if (!context) return;
  const { width, height } = size;
  const { circumference, height: sheetHeight } = scene.drawing.size;
  context.clearRect(0, 0, width, height);
  for (const turn of [-1, 0, 1]) {
    paintRange(
      context,
      scene,
      {
        pxPerMm: view.pxPerMm,
        ratio: 1,
        seamX: (turn * circumference - view.leftMm) * view.pxPerMm,
        topY: (view.topMm - sheetHeight) * view.pxPerMm,
      },
      rangeInView(turn),
    );
  }
}

function rangeInView(turn: number) {
  const { grid, tileWidth, tileHeight, size: sheet } = scene.drawing;
  const left = view.leftMm - turn * sheet.circumference;
  const right = left + size.width / view.pxPerMm;
  const bottom = view.topMm - size.height / view.pxPerMm;
  return {
    staveFrom: Math.max(0, Math.floor(left / tileWidth) - 1),
    staveTo: Math.min(grid.staves, Math.ceil(right / tileWidth) + 1),
    courseFrom: Math.max(0, Math.floor(bottom / tileHeight) - 1),
    courseTo: Math.min(grid.courses, Math.ceil(view.topMm / tileHeight) + 1),
  };
}

function showBare(): void {
  clearPage();
  bare = document.createElement('canvas');
  bare.width = size.width;
  bare.height = size.height;
  document.body.append(bare);
}

/** A stroke along a slanting way: a few tiles a frame, another wood each time round. */
function strokeAt(frame: number): number[] {
  const { staves, courses } = scene.drawing.grid;
  return [0, 1, 2, 3].map((i) => {
    const along = frame * 4 + i;
    return (Math.floor(along / 3) % courses) * staves + (along % staves);
  });
}

function layAt(frame: number): number[] {
  const positions = strokeAt(frame);
  const cells = scene.cells.slice();
  for (const position of positions) cells[position] = frame % 4;
  scene = { ...scene, cells };
  return positions;
}

/** Nearer in small steps for a second, then further off as long. */
function zoomAt(frame: number): void {
  const factor = Math.floor(frame / 30) % 2 === 0 ? 1.03 : 1 / 1.03;
  view = zoomedAt(view, bounds, { x: size.width / 2, y: size.height / 2 }, factor);
}

/** One edit: a course laid in another wood, as the store does it, patch and all. */
function courseChange(frame: number): CellsChange | null {
  const { staves, courses } = scene.drawing.grid;
  const first = (frame % courses) * staves;
  const positions = Array.from({ length: staves }, (_, stave) => first + stave);
  return layChange(scene.cells, positions, frame % 4);
}

function withChange(change: Change | undefined): readonly number[] {
  if (change?.kind !== 'cells') return [];
  const cells = scene.cells.slice();
  change.positions.forEach((position, i) => (cells[position] = change.after[i] ?? 0));
  scene = { ...scene, cells };
  return change.positions;
}

let laid: CellsChange | null = null;

/** Lays a course in an even frame and takes it back in an odd one. */
function courseAt(frame: number): readonly number[] {
  if (frame % 2 === 0) {
    laid = courseChange(frame);
    return withChange(laid ?? undefined);
  }
  return withChange(laid ? invertPatch([laid])[0] : undefined);
}

/** Bytes of script memory in use, after the garbage is collected where the browser lets us ask for it. */
function memoryInUse(): number {
  const page = globalThis as unknown as {
    gc?: () => void;
    performance: { memory?: { usedJSHeapSize: number } };
  };
  page.gc?.();
  return page.performance.memory?.usedJSHeapSize ?? NaN;
}

(globalThis as unknown as CanvasBenchPage).canvasBench = {
  async open(staves, courses) {
    clearPage();
    const began = performance.now();
    scene = sceneOf(staves, courses);
    const container = document.createElement('div');
    document.body.append(container);
    const current = new PatternStage({ container, size, colours: COLOURS });
    stage = current;
    bounds = {
      size,
      sheet: scene.drawing.size,
      insets: INSETS,
      leastPxPerMm: 0.05,
      mostPxPerMm: 8,
    };
    view = viewOfWhole(bounds);
    current.setView(view);
    current.setScene(scene);
    await settled();
    return performance.now() - began;
  },
  async zoom(factor) {
    view = zoomedAt(view, bounds, { x: size.width / 2, y: size.height / 2 }, factor);
    stage?.setView(view);
    await settled();
  },
  pan: (frames) =>
    drive(frames, () => {
      view = panned(view, bounds, -3, 0);
      stage?.setView(view);
    }),
  async paint(frames) {
    const figures = await drive(frames, (frame) => stage?.lay(scene, layAt(frame)));
    stage?.strokeDone();
    await settled();
    return figures;
  },
  async zoomInAndOut(frames) {
    const figures = await drive(frames, (frame) => {
      zoomAt(frame);
      stage?.setView(view);
    });
    await settled();
    return figures;
  },
  async layCourse(frames) {
    const figures = await drive(frames, (frame) => {
      stage?.lay(scene, courseAt(frame));
      stage?.strokeDone();
    });
    await settled();
    return figures;
  },
  async edits(count) {
    const before = memoryInUse();
    const done: Change[] = [];
    for (let edit = 0; edit < count; edit++) {
      const change = courseChange(edit);
      if (change) done.push(change);
      stage?.lay(scene, withChange(change ?? undefined));
      stage?.strokeDone();
      if (edit % 20 === 0) await nextFrame();
    }
    await settled();
    return memoryInUse() - before;
  },
  bareZoom(frames) {
    showBare();
    return drive(frames, (frame) => {
      zoomAt(frame);
      paintBare();
    });
  },
  bareCourse(frames) {
    showBare();
    return drive(frames, (frame) => {
      courseAt(frame);
      paintBare();
    });
  },
  barePan(frames) {
    showBare();
    return drive(frames, () => {
      view = panned(view, bounds, -3, 0);
      paintBare();
    });
  },
  barePaint(frames) {
    showBare();
    return drive(frames, (frame) => {
      layAt(frame);
      paintBare();
    });
  },
};
