import { tileOf, type Grid } from '@shared/layout/cells';

/**
 * The borders round some tiles of an unrolled pattern as one SVG path, one unit a tile, course A at the
 * bottom (y grows downwards). Between two of the tiles there is no border. The picture ends at the seam,
 * so tiles there are closed off on both of its sides.
 */
export function tileBorders(grid: Grid, positions: Iterable<number>): string {
  const inside = new Set(positions);
  let path = '';
  for (const position of inside) {
    const { stave, course } = tileOf(grid, position);
    const top = grid.courses - 1 - course;
    if (stave === 0 || !inside.has(position - 1)) path += `M${stave} ${top}v1`;
    if (stave === grid.staves - 1 || !inside.has(position + 1)) path += `M${stave + 1} ${top}v1`;
    if (!inside.has(position - grid.staves)) path += `M${stave} ${top + 1}h1`;
    if (!inside.has(position + grid.staves)) path += `M${stave} ${top}h1`;
  }
  return path;
}
