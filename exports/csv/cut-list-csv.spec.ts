import { describe, expect, it } from 'vitest';
import { startingLayout } from '@shared/layout/starting-layout';
import type { CutList } from '@shared/pieces/cut-list';
import { cutListCsv } from './cut-list-csv';

const { woods } = startingLayout('Test ring');
const tiles = ['A 1', 'A 3'];

function listOf(names: readonly string[]): CutList {
  const row = {
    kind: {
      number: 1,
      wood: 0,
      edges: { left: 'tab', right: 'tab', bottom: 'flat', top: 'socket' },
      mirrored: false,
      count: names.length,
      spares: 1,
      positions: [],
      faceDown: [],
      halfTurned: [],
    },
    toCut: names.length + 1,
    pieceLength: 29.94,
    pieceWidth: 46.68,
    boardLength: 99.36,
    tiles: names,
  } as const;
  return { rows: [row], tiles: names.length, spares: 1, toCut: names.length + 1 };
}

describe('the cut list as CSV', () => {
  it('has one row a piece kind, lengths in millimetres', () => {
    expect(cutListCsv({ woods }, listOf(tiles), 'mm').split('\r\n')).toEqual([
      '\ufeffkind,wood,edges,drawn as seen,count,spares,to cut,length along grain (mm),width (mm),board length (mm),tiles',
      '1,Hard maple,"left tab, right tab, bottom flat, top socket",from outside,2,1,3,29.94,46.68,99.36,"A 1, A 3"',
      '',
    ]);
  });

  it('or in inches', () => {
    const [head, row] = cutListCsv({ woods }, listOf(tiles), 'in').split('\r\n');
    expect(head).toContain('board length (in)');
    expect(row).toContain(',1.179,1.838,3.912,');
  });

  it('a list of tiles too long for a cell is left to the manifest', () => {
    const long = Array.from({ length: 9000 }, (_, index) => `A ${index}`);
    expect(cutListCsv({ woods }, listOf(long), 'mm')).toContain(
      ',"9000 tiles, listed in manifest.json"\r\n',
    );
  });
});
