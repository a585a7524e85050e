import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { cellAt, roundStave } from '@shared/layout/cells';
import { chunkGrid, chunksTouchedBy, tilesDrawnFor, tilesOfChunk } from './chunk-grid';

const reach = { staves: 1, courses: 1 };

describe('the sheet cut into chunks', () => {
  const chunks = chunkGrid({ staves: 32, courses: 9 }, 16, reach);

  it('covers 32 × 9 with two chunks, the short row included', () => {
    expect([chunks.columns, chunks.rows]).toEqual([2, 1]);
    expect(tilesOfChunk(chunks, 1)).toEqual({
      staveFrom: 16,
      staveTo: 32,
      courseFrom: 0,
      courseTo: 9,
    });
  });

  it('repaints one chunk for a tile in its middle', () => {
    expect([...chunksTouchedBy(chunks, cellAt(chunks.grid, 8, 4))]).toEqual([0]);
  });

  it('repaints both chunks for a tile whose tab reaches over their border', () => {
    expect([...chunksTouchedBy(chunks, cellAt(chunks.grid, 15, 4))].sort()).toEqual([0, 1]);
  });

  it('repaints the chunk on the other side of the seam', () => {
    expect([...chunksTouchedBy(chunks, cellAt(chunks.grid, 0, 4))].sort()).toEqual([0, 1]);
    expect([...chunksTouchedBy(chunks, cellAt(chunks.grid, 31, 4))].sort()).toEqual([0, 1]);
  });

  it('repaints exactly the chunks that draw the tile', () => {
    const sizes = fc.record({
      staves: fc.integer({ min: 6, max: 70 }),
      courses: fc.integer({ min: 1, max: 40 }),
      span: fc.constantFrom(2, 4, 8, 16),
    });
    fc.assert(
      fc.property(sizes, fc.nat(), ({ staves, courses, span }, seed) => {
        const cut = chunkGrid({ staves, courses }, span, reach);
        const position = seed % (staves * courses);
        const drawing = Array.from({ length: cut.columns * cut.rows }, (_, i) => i).filter(
          (chunk) => drawnPositions(cut, chunk).has(position),
        );
        expect([...chunksTouchedBy(cut, position)].sort((a, b) => a - b)).toEqual(drawing);
      }),
    );
  });
});

function drawnPositions(chunks: ReturnType<typeof chunkGrid>, chunk: number): Set<number> {
  const range = tilesDrawnFor(chunks, chunk);
  const positions = new Set<number>();
  for (let course = range.courseFrom; course < range.courseTo; course++) {
    for (let stave = range.staveFrom; stave < range.staveTo; stave++) {
      positions.add(cellAt(chunks.grid, roundStave(chunks.grid, stave), course));
    }
  }
  return positions;
}
