import type { Build } from '../layout/schema';

/** Spares of a kind: the workshop's share of its count rounded up, at least the workshop's minimum. */
export function spareCount(
  count: number,
  build: Pick<Build, 'spareShare' | 'spareMinimum'>,
): number {
  // 0.07 × 100 is 7.000000000000001: a share that divides must not round up to one more
  const share = Math.ceil(Math.round(count * build.spareShare * 1e9) / 1e9);
  return Math.max(share, build.spareMinimum);
}
