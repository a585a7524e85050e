import { expect, it } from 'vitest';
import { decodeCells } from './cells';
import { smallLayout } from './small-layout.fixture';
import { thumbnailOf } from './thumbnail';

it('a small pattern is shown tile by tile', () => {
  const layout = smallLayout();
  layout.cells[9] = 2;
  const { staves, courses, colours, cells } = thumbnailOf(layout);
  expect([staves, courses]).toEqual([8, 3]);
  expect(colours).toEqual(layout.woods.map(({ colour }) => colour));
  expect(decodeCells(cells)).toEqual(layout.cells);
});

it('a large pattern is sampled evenly, within 48 × 24', () => {
  const layout = smallLayout();
  const shell = { ...layout.shell, staves: 240, courses: 120 };
  const cells = Uint8Array.from({ length: 240 * 120 }, (_, i) => (i % 240 < 120 ? 0 : 1));
  const thumbnail = thumbnailOf({ ...layout, shell, cells });
  expect([thumbnail.staves, thumbnail.courses]).toEqual([48, 24]);
  const shown = decodeCells(thumbnail.cells)!;
  expect(shown.slice(0, 48)).toEqual(Uint8Array.from({ length: 48 }, (_, i) => (i < 24 ? 0 : 1)));
});
