/**
 * The figure of a wood as it is drawn: besides its colour every wood of a layout has marks of its own, so
 * that two woods can be told apart by who sees no colours.
 */

/** Kinds of marks, each in three densities: 24 figures, as many as a layout has woods. */
export const FIGURE_MARKS = [
  'plain',
  'pores',
  'arches',
  'flecks',
  'ribbon',
  'waves',
  'specks',
  'stripes',
] as const;
export type FigureMark = (typeof FIGURE_MARKS)[number];

export interface WoodFigure {
  readonly mark: FigureMark;
  /** 1 is sparse, 3 dense. */
  readonly density: 1 | 2 | 3;
}

const DENSITIES = [2, 1, 3] as const;
const FIGURES: readonly WoodFigure[] = DENSITIES.flatMap((density) =>
  FIGURE_MARKS.map((mark) => ({ mark, density })),
);

/**
 * One figure a wood, no two alike. A wood keeps its figure by its key whatever is added after it; where two
 * keys ask for the same one, the later takes the next free.
 */
export function figuresOf(woods: readonly { readonly key: string }[]): WoodFigure[] {
  const taken = new Set<number>();
  return woods.map(({ key }) => {
    let wish = hashOf(key) % FIGURE_MARKS.length;
    while (taken.has(wish)) wish = (wish + 1) % FIGURES.length;
    taken.add(wish);
    return FIGURES[wish] as WoodFigure;
  });
}

/** FNV-1a, 32 bit. */
function hashOf(text: string): number {
  let hash = 0x811c9dc5;
  for (let i = 0; i < text.length; i++) hash = Math.imul(hash ^ text.charCodeAt(i), 0x01000193);
  return hash >>> 0;
}
