/** Which of a layout's woods stand for the woods of a patch copied elsewhere. */
import { BOUNDS, type Wood } from '@shared/layout/schema';
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

/** A layout's woods for the woods of a patch. */
export interface StockedWoods {
  /** The layout's woods, with those added at the end that it had nothing like. */
  readonly woods: readonly Wood[];
  readonly added: readonly Wood[];
  /** For each wood of the patch its index among `woods`. */
  readonly indices: readonly number[];
}

/** Finds the woods alike and adds the others while there is room; after that the nearest stands for them. */
export function stockWoods(stocked: readonly Wood[], wanted: readonly Wood[]): StockedWoods {
  const woods = [...stocked];
  const indices = woodsAlike(wanted, stocked).map((found, i) => {
    const wood = wanted[i];
    if (found !== null || !wood) return found ?? 0;
    if (woods.length >= BOUNDS.woods.most) return nearestWood(wood, woods).index;
    woods.push(wood);
    return woods.length - 1;
  });
  return { woods, added: woods.slice(stocked.length), indices };
}
