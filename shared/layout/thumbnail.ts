import { encodeCells } from './cells';
import type { Layout } from './schema';

/** The picture as it travels (see api/commission.ts): sampled tiles, each the index of a colour. */
export interface Thumbnail {
  readonly staves: number;
  readonly courses: number;
  readonly colours: string[];
  /** base64, one byte a tile, course by course from the bottom */
  readonly cells: string;
}

/** A thumbnail shows at most this many tiles across and up; larger patterns are sampled. */
const STAVES_MOST = 48;
const COURSES_MOST = 24;

/** A small picture of the pattern: sampled tiles, each the index of a colour. */
export function thumbnailOf(layout: Pick<Layout, 'shell' | 'woods' | 'cells'>): Thumbnail {
  const { staves, courses } = layout.shell;
  const across = Math.min(staves, STAVES_MOST);
  const up = Math.min(courses, COURSES_MOST);
  const cells = new Uint8Array(across * up);
  for (let row = 0; row < up; row++) {
    const course = Math.floor((row * courses) / up);
    for (let column = 0; column < across; column++) {
      const stave = Math.floor((column * staves) / across);
      cells[row * across + column] = layout.cells[course * staves + stave] ?? 0;
    }
  }
  return {
    staves: across,
    courses: up,
    colours: layout.woods.map((wood) => wood.colour),
    cells: encodeCells(cells),
  };
}
