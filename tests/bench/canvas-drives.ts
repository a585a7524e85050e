/** What the canvas bench asks of its page. */
export interface DriveFigures {
  /** Milliseconds of script a frame, and between frames, in the order they came. */
  readonly script: number[];
  readonly frames: number[];
}

export interface CanvasBench {
  /** Milliseconds from nothing to every chunk drawn. */
  open(staves: number, courses: number): Promise<number>;
  zoom(factor: number): Promise<void>;
  pan(frames: number): Promise<DriveFigures>;
  paint(frames: number): Promise<DriveFigures>;
  barePan(frames: number): Promise<DriveFigures>;
  barePaint(frames: number): Promise<DriveFigures>;
}

/** The page's global scope. */
export interface CanvasBenchPage {
  canvasBench: CanvasBench;
}
