/** The pattern: one byte a tile, the index of its wood; byte number = course × staves + stave, both from 0. */

/** Size of the unrolled pattern. */
export interface Grid {
  readonly staves: number;
  readonly courses: number;
}

/** Position of a tile in the cells. Stave and course count from 0; a stave beyond the seam comes in again. */
export function cellAt(grid: Grid, stave: number, course: number): number {
  return course * grid.staves + roundStave(grid, stave);
}

/** The stave counted round the ring: −1 is the last, `staves` the first. */
export function roundStave(grid: Grid, stave: number): number {
  return ((stave % grid.staves) + grid.staves) % grid.staves;
}

/** Stave and course (from 0) of a position. */
export function tileOf(grid: Grid, position: number): { stave: number; course: number } {
  return { stave: position % grid.staves, course: Math.floor(position / grid.staves) };
}

/** Course letters from the bottom: 0 is "A", 25 "Z", 26 "AA". */
export function courseLetters(course: number): string {
  const letter = String.fromCharCode(65 + (course % 26));
  return course < 26 ? letter : courseLetters(Math.floor(course / 26) - 1) + letter;
}

/** A tile's name: course letters and stave number from 1, "D 12". */
export function tileName(stave: number, course: number): string {
  return `${courseLetters(course)} ${stave + 1}`;
}

/** Cells as base64 (RFC 4648, with padding). */
export function encodeCells(cells: Uint8Array): string {
  let binary = '';
  for (const byte of cells) binary += String.fromCharCode(byte);
  return btoa(binary);
}

/** The bytes of base64 text, or null when it is not base64. */
export function decodeCells(text: string): Uint8Array | null {
  if (!/^(?:[A-Za-z0-9+/]{4})*(?:[A-Za-z0-9+/]{2}==|[A-Za-z0-9+/]{3}=)?$/.test(text)) return null;
  return Uint8Array.from(atob(text), (character) => character.charCodeAt(0));
}

/** How many tiles each wood fills, one figure a wood. */
export function countWoods(cells: Uint8Array, woods: number): number[] {
  const counts = new Array<number>(woods).fill(0);
  for (const wood of cells) counts[wood] = (counts[wood] ?? 0) + 1;
  return counts;
}
