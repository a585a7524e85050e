/** What the parameters of a starting pattern may be, and sentences for what they may not. */
import { BOUNDS, type Problem } from '../schema';
import type { StartingPattern, Stripe } from './starting-pattern';

const TURN = { least: 1, most: BOUNDS.staves.most };
const HEIGHT = { least: 1, most: BOUNDS.courses.most };

/** Whole numbers, inclusive; staves and courses are sizes of a field, a diamond or a crest. */
export const PATTERN_BOUNDS = {
  stripes: { least: 1, most: BOUNDS.woods.most },
  stripe: HEIGHT,
  woods: { least: 2, most: BOUNDS.woods.most },
  staves: TURN,
  courses: HEIGHT,
  /** A diamond or a crest needs two sides. */
  slope: { least: 2, most: BOUNDS.staves.most },
  diamondCourses: { least: 2, most: BOUNDS.courses.most },
  lead: { least: 1, most: 2 * BOUNDS.courses.most },
  rise: HEIGHT,
  share: { least: 0, most: 100 },
  seed: { least: 0, most: 9999 },
} as const;

interface Bound {
  readonly least: number;
  readonly most: number;
}

/** Everything that keeps a pattern from being laid with so many woods, field by field; empty when it can be. */
export function patternProblems(pattern: StartingPattern, woods: number): Problem[] {
  switch (pattern.kind) {
    case 'checker':
      return [
        ...within('woods', pattern.woods.length, PATTERN_BOUNDS.woods),
        ...pattern.woods.flatMap((wood, i) => known(`woods.${i}`, wood, woods)),
        ...within('staves', pattern.staves, PATTERN_BOUNDS.staves),
        ...within('courses', pattern.courses, PATTERN_BOUNDS.courses),
      ];
    case 'bands':
      return stripeProblems(pattern.stripes, woods);
    case 'helix':
      return [
        ...stripeProblems(pattern.stripes, woods),
        ...within('lead', pattern.lead, PATTERN_BOUNDS.lead),
      ];
    case 'diamonds':
      return [
        ...known('ground', pattern.ground, woods),
        ...known('diamond', pattern.diamond, woods),
        ...within('staves', pattern.staves, PATTERN_BOUNDS.slope),
        ...within('courses', pattern.courses, PATTERN_BOUNDS.diamondCourses),
      ];
    case 'zigzag':
      return [
        ...stripeProblems(pattern.stripes, woods),
        ...within('staves', pattern.staves, PATTERN_BOUNDS.slope),
        ...within('rise', pattern.rise, PATTERN_BOUNDS.rise),
      ];
    case 'scatter':
      return [
        ...shareProblems(pattern.shares, woods),
        ...within('seed', pattern.seed, PATTERN_BOUNDS.seed),
      ];
  }
}

function stripeProblems(stripes: readonly Stripe[], woods: number): Problem[] {
  return [
    ...within('stripes', stripes.length, PATTERN_BOUNDS.stripes),
    ...stripes.flatMap(({ wood, width }, i) => [
      ...known(`stripes.${i}.wood`, wood, woods),
      ...within(`stripes.${i}.width`, width, PATTERN_BOUNDS.stripe),
    ]),
  ];
}

function shareProblems(
  shares: readonly { readonly wood: number; readonly share: number }[],
  woods: number,
): Problem[] {
  const parts = shares.flatMap(({ wood, share }, i) => [
    ...known(`shares.${i}.wood`, wood, woods),
    ...(share >= PATTERN_BOUNDS.share.least && share <= PATTERN_BOUNDS.share.most
      ? []
      : [{ field: `shares.${i}.share`, message: 'must be from 0 to 100' }]),
  ]);
  const some = shares.some(({ share }) => share > 0);
  return some
    ? parts
    : [...parts, { field: 'shares', message: 'must give at least one wood more than 0' }];
}

function within(field: string, value: number, { least, most }: Bound): Problem[] {
  if (Number.isInteger(value) && value >= least && value <= most) return [];
  return [{ field, message: `must be a whole number from ${least} to ${most}` }];
}

function known(field: string, wood: number, woods: number): Problem[] {
  if (Number.isInteger(wood) && wood >= 0 && wood < woods) return [];
  return [{ field, message: 'must be one of the woods of the layout' }];
}
