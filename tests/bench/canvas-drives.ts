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
  /** Comes nearer and goes further off by turns. */
  zoomInAndOut(frames: number): Promise<DriveFigures>;
  /** Lays a whole course, and takes it back in the next frame, by turns. */
  layCourse(frames: number): Promise<DriveFigures>;
  /** Makes so many edits and takes as many back; answers the bytes of script memory more than before. */
  edits(count: number): Promise<number>;
  barePan(frames: number): Promise<DriveFigures>;
  barePaint(frames: number): Promise<DriveFigures>;
  bareZoom(frames: number): Promise<DriveFigures>;
  bareCourse(frames: number): Promise<DriveFigures>;
}

/** The page's global scope. */
export interface CanvasBenchPage {
  canvasBench: CanvasBench;
}
