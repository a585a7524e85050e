/** What the keyboard's place sounds like: position, wood, and the neighbours' woods. */
import { cellAt, courseLetters, roundStave, tileName } from '@shared/layout/cells';
import type { Tile, TileBox } from '@shared/layout/extent';
import type { Layout, Wood } from '@shared/layout/schema';
import { inSentence, sizeWords, tilesWords } from './sentence-words';

/** "D 12, white ash. Left black walnut, right white ash, above white ash, below the end of the shell." */
export function tileWords(layout: Pick<Layout, 'shell' | 'woods' | 'cells'>, tile: Tile): string {
  const grid = layout.shell;
  const woodAt = (stave: number, course: number): string => {
    if (course < 0 || course >= grid.courses) return 'the end of the shell';
    const wood = layout.cells[cellAt(grid, stave, course)] ?? 0;
    return inSentence(layout.woods[wood]?.name ?? 'no wood');
  };
  const { stave, course } = tile;
  const here = tileName(roundStave(grid, stave), course);
  const seam = roundStave(grid, stave) === 0 ? ' At the seam.' : '';
  return (
    `${here}, ${woodAt(stave, course)}.${seam} ` +
    `Left ${woodAt(stave - 1, course)}, right ${woodAt(stave + 1, course)}, ` +
    `above ${woodAt(stave, course + 1)}, below ${woodAt(stave, course - 1)}.`
  );
}

/** "Laid black walnut on 8 tiles from D 12." */
export function laidWords(tile: Tile, count: number, wood: string): string {
  const place = `${courseLetters(tile.course)} ${tile.stave + 1}`;
  if (count === 0) return `${place} is ${wood} already.`;
  return count === 1
    ? `${place} is now ${wood}.`
    : `Laid ${wood} on ${tilesWords(count)} from ${place}.`;
}

/** "8 tiles will change." and what else a touch there would come to. */
export function touchWords(reached: number, changed: number, added: readonly Wood[]): string {
  if (reached === 0) return 'No tile is reached here.';
  const woods = added.map(({ name }) => inSentence(name)).join(', ');
  const more = woods === '' ? '' : ` Adds ${woods} to the woods.`;
  if (changed === 0) return `Nothing changes: ${tilesWords(reached)} already so.${more}`;
  return `${tilesWords(changed)} will change.${more}`;
}

/** "Copied 3 × 2 tiles from D 12." */
export function copiedWords(box: TileBox): string {
  return `Copied ${sizeWords(box)} from ${tileName(box.stave, box.course)} to the right and up. Lay them here or in another layout.`;
}

/** What others' edits that met mine come to; the tiles are outlined meanwhile. */
export function overlaidWords(count: number): string {
  return `Somebody else laid ${tilesWords(count)} you had laid too. Yours lie on top, outlined until you lay them again.`;
}
