/** Which of a layout's woods stand for the woods of a patch copied elsewhere. */
import type { Wood } from '@shared/layout/schema';
import { contrastOf } from './contrast';

/** Woods nearer than this look alike as finished: the contrast check's own caution. */
export const ALIKE_WITHIN = 10;

/**
 * For each wood the index of the layout's wood with its key, else of the nearest in colour within
 * `ALIKE_WITHIN`, else null: the layout has nothing like it.
 */
export function woodsAlike(
  wanted: readonly Wood[],
  stocked: readonly Wood[],
): readonly (number | null)[] {
  return wanted.map((wood) => {
    const same = stocked.findIndex(({ key }) => key === wood.key);
    if (same >= 0) return same;
    const { index, distance } = nearestWood(wood, stocked);
    return distance < ALIKE_WITHIN ? index : null;
  });
}

/** The wood nearest in colour and its ΔE00. */
export function nearestWood(
  { colour }: Pick<Wood, 'colour'>,
  stocked: readonly Wood[],
): { readonly index: number; readonly distance: number } {
  const distances = stocked.map((wood) => contrastOf(colour, wood.colour));
  const distance = Math.min(...distances);
  return { index: Math.max(0, distances.indexOf(distance)), distance };
}
