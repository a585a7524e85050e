import { countWoods } from '../layout/cells';
import type { Layout } from '../layout/schema';
import { thumbnailOf } from '../layout/thumbnail';
import type { Commission } from './commission';

/** What the table of commissions shows of a layout. */
export type LayoutSummary = Pick<Commission, 'staves' | 'courses' | 'woods' | 'thumbnail'>;

/** Size, woods (most tiles first, those not laid left out) and thumbnail of a layout. */
export function summaryOf(layout: Layout): LayoutSummary {
  const counts = countWoods(layout.cells, layout.woods.length);
  const woods = layout.woods
    .map(({ name }, i) => ({ name, tiles: counts[i] ?? 0 }))
    .filter(({ tiles }) => tiles > 0)
    .sort((a, b) => b.tiles - a.tiles);
  return {
    staves: layout.shell.staves,
    courses: layout.shell.courses,
    woods: woods.map(({ name }) => name),
    thumbnail: thumbnailOf(layout),
  };
}
