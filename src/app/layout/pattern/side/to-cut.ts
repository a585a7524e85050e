/** How much there is to cut, in one sentence's figures. */
import { cutList } from '@shared/pieces/cut-list';
import { edgesKey } from '@shared/pieces/tile-outline';
import type { Layout } from '@shared/layout/schema';
import { counted, tilesWords } from '../sentence-words';

/** "288 tiles in 4 outlines, 10 piece kinds, with 29 spares". */
export function toCutSentence(layout: Layout): string {
  const { rows, tiles, spares } = cutList(layout);
  const outlines = new Set(
    rows.map(({ kind }) => `${edgesKey(kind.edges)} ${kind.mirrored ? 'mirrored' : ''}`),
  );
  const kinds = `${counted(outlines.size, 'outline')}, ${counted(rows.length, 'piece kind')}`;
  return `${tilesWords(tiles)} in ${kinds}, with ${counted(spares, 'spare')}`;
}
