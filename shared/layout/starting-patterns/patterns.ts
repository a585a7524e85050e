import type { Grid } from '../cells';
import { PATTERN_BOUNDS } from './bounds';
import {
  divisorsOf,
  filled,
  greatestDivisor,
  modulo,
  nearestFirst,
  periodOf,
  woodOfStripe,
  type Bands,
  type Checker,
  type Diamonds,
  type Helix,
  type LaidPattern,
  type Zigzag,
} from './starting-pattern';

/** A board of fields; meets when the fields of one round of woods divide the staves. */
export function layChecker(pattern: Checker, grid: Grid): LaidPattern {
  const { woods, staves, courses } = pattern;
  const cells = filled(grid, (stave, course) => {
    const field = Math.floor(stave / staves) + Math.floor(course / courses);
    return woods[field % woods.length] ?? 0;
  });
  const round = staves * woods.length;
  if (grid.staves % round === 0) return { meets: true, cells, period: round };
  const widths = divisorsOf(grid.staves).filter((w) => grid.staves % (w * woods.length) === 0);
  return {
    meets: false,
    cells,
    field: 'staves',
    reason: `Fields of ${staves} in ${woods.length} woods repeat every ${round} staves, which does not divide ${grid.staves}.`,
    offers: nearestFirst(widths, staves),
  };
}

/** Level bands from the bottom; they always meet. */
export function layBands(pattern: Bands, grid: Grid): LaidPattern {
  const cells = filled(grid, (_, course) => woodOfStripe(pattern.stripes, course));
  return { meets: true, cells, period: 1 };
}

/**
 * Stripes that climb; meets when one turn climbs a whole number of stripe rounds, which then is the number of
 * strands that run side by side. The left hand is the right one in a mirror.
 */
export function layHelix(pattern: Helix, grid: Grid): LaidPattern {
  const { stripes, lead, hand } = pattern;
  const { staves } = grid;
  const climbed = (stave: number) => Math.floor((stave * lead) / staves);
  const cells = filled(grid, (stave, course) =>
    woodOfStripe(stripes, course - climbed(hand === 'right' ? stave : staves - 1 - stave)),
  );
  const round = periodOf(stripes);
  if (lead % round === 0) {
    return { meets: true, cells, period: staves / greatestDivisor(staves, lead / round) };
  }
  const strands = Math.max(1, Math.floor(lead / round) - 2);
  const leads = Array.from({ length: 6 }, (_, i) => (strands + i) * round);
  return {
    meets: false,
    cells,
    field: 'lead',
    reason: `A lead of ${lead} ${lead === 1 ? 'course' : 'courses'} a turn does not meet at the seam: the stripes repeat every ${round} courses.`,
    offers: nearestFirst(leads.filter(isLead), lead),
  };
}

/** Diamonds standing on their points; meets when their width divides the staves. */
export function layDiamonds(pattern: Diamonds, grid: Grid): LaidPattern {
  const { ground, diamond, staves, courses, drawn } = pattern;
  const laid = drawn === 'filled' ? isInDiamond : isOnDiamond;
  const cells = filled(grid, (stave, course) => {
    const [across, up] = [modulo(stave, staves), modulo(course, courses)];
    return laid(pattern, across, up) ? diamond : ground;
  });
  return dividing(grid, staves, 'Diamonds', cells);
}

/** Each course of a diamond is as wide as its sides leave it, to the nearest width that stays in the middle. */
function isInDiamond({ staves, courses }: Diamonds, across: number, up: number): boolean {
  if (up < 0 || up >= courses) return false;
  const fromMiddle = Math.abs(up + 0.5 - courses / 2) / (courses / 2);
  const narrowest = staves % 2 === 0 ? 2 : 1;
  const steps = Math.max(0, Math.round(((1 - fromMiddle) * staves - narrowest) / 2));
  return Math.abs(across + 0.5 - staves / 2) < steps + narrowest / 2;
}

/** True for the tiles of a diamond that have a neighbour outside it. */
function isOnDiamond(diamond: Diamonds, across: number, up: number): boolean {
  const inside = (a: number, u: number) => isInDiamond(diamond, a, u);
  const surrounded =
    inside(across - 1, up) &&
    inside(across + 1, up) &&
    inside(across, up - 1) &&
    inside(across, up + 1);
  return inside(across, up) && !surrounded;
}

/** Stripes that rise and fall; meets when the crests divide the staves. */
export function layZigzag(pattern: Zigzag, grid: Grid): LaidPattern {
  const { stripes, staves, rise } = pattern;
  const height = (stave: number) => {
    const along = modulo(stave, staves);
    const toCrest = Math.min(along, staves - along) / (staves / 2);
    return Math.round(toCrest * rise);
  };
  const cells = filled(grid, (stave, course) => woodOfStripe(stripes, course - height(stave)));
  return dividing(grid, staves, 'Crests', cells);
}

function isLead(lead: number): boolean {
  return lead >= PATTERN_BOUNDS.lead.least && lead <= PATTERN_BOUNDS.lead.most;
}

function dividing(grid: Grid, period: number, what: string, cells: Uint8Array): LaidPattern {
  if (grid.staves % period === 0) return { meets: true, cells, period };
  return {
    meets: false,
    cells,
    field: 'staves',
    reason: `${what} every ${period} staves do not divide ${grid.staves} staves.`,
    offers: nearestFirst(
      divisorsOf(grid.staves).filter((d) => d > 1),
      period,
    ),
  };
}
