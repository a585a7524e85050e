/**
 * Ways to choose among a few woods for many colours. Plain takes the nearest for every tile by itself.
 * Ordered mixes two woods a tile by a matrix of thresholds. Error diffusion carries what a tile missed on to
 * its neighbours. Both of the latter close at the seam: the matrix comes in whole rounds, and the error of
 * the last stave goes into the first of the next course.
 */
import type { Lab65 } from 'culori/fn';
import type { Grid } from '../layout/cells';
import { colourDifference } from './contrast';

export const DITHERINGS = ['plain', 'ordered', 'error-diffusion'] as const;
export type Dithering = (typeof DITHERINGS)[number];

export interface PaletteWood {
  readonly lab: Lab65;
  /** Above 0; 1 is neutral. */
  readonly weight: number;
}

type Palette = readonly PaletteWood[];

/** The index in the palette for each tile. */
export function dithered(
  dithering: Dithering,
  wished: readonly Lab65[],
  palette: Palette,
  grid: Grid,
): number[] {
  switch (dithering) {
    case 'plain':
      return wished.map((lab) => nearest(palette, lab, ({ weight }) => weight));
    case 'ordered':
      return ordered(wished, palette, grid);
    case 'error-diffusion':
      return diffused(wished, palette, grid);
  }
}

function nearest(palette: Palette, lab: Lab65, pull: (wood: PaletteWood) => number): number {
  let found = 0;
  let least = Infinity;
  palette.forEach((wood, i) => {
    const difference = colourDifference(wood.lab, lab) / pull(wood);
    if (difference < least) [found, least] = [i, difference];
  });
  return found;
}

const EVENLY = (): number => 1;

/** Bayer's 4 × 4 thresholds (B. E. Bayer, IEEE ICC 1973; from memory), between 0 and 1. */
const BAYER = [
  [0, 8, 2, 10],
  [12, 4, 14, 6],
  [3, 11, 1, 9],
  [15, 7, 13, 5],
].map((row) => row.map((rank) => (rank + 0.5) / 16));

function ordered(wished: readonly Lab65[], palette: Palette, { staves }: Grid): number[] {
  // whole rounds of the matrix: where the staves do not divide by four, its columns are squeezed a little
  const columns = 4 * Math.max(1, Math.round(staves / 4));
  return wished.map((lab, tile) => {
    const column = Math.floor((((tile % staves) + 0.5) * columns) / staves);
    const threshold = BAYER[Math.floor(tile / staves) % 4]?.[column % 4] ?? 0;
    const { darker, lighter, lighterShare } = mixOf(palette, lab);
    return lighterShare > threshold ? lighter : darker;
  });
}

interface Mix {
  readonly darker: number;
  readonly lighter: number;
  /** Share of tiles the lighter wood gets, 0 to 1, weights counted in. */
  readonly lighterShare: number;
}

/** How much more a mix may miss its colour for being of woods closer to each other: far ones look restless. */
const RESTLESSNESS = 0.1;

/** The nearest wood, and the one that brings it closest to the colour when the two are mixed. */
function mixOf(palette: Palette, lab: Lab65): Mix {
  const first = nearest(palette, lab, EVENLY);
  let second = first;
  let share = 0;
  let least = Infinity;
  palette.forEach((wood, i) => {
    const near = palette[first];
    if (i === first || !near) return;
    const mix = alongSegment(near.lab, wood.lab, lab);
    const cost = mix.miss + RESTLESSNESS * mix.length * mix.share * (1 - mix.share);
    if (cost < least) [second, share, least] = [i, mix.share, cost];
  });
  return inOrderOfLight(palette, { first, second, share });
}

/** Where between two colours a third lies nearest: the share of the second, and by how much it is missed. */
function alongSegment(from: Lab65, to: Lab65, lab: Lab65) {
  const [l, a, b] = [to.l - from.l, to.a - from.a, to.b - from.b];
  const square = l * l + a * a + b * b;
  const along = (lab.l - from.l) * l + (lab.a - from.a) * a + (lab.b - from.b) * b;
  const share = square === 0 ? 0 : Math.min(1, Math.max(0, along / square));
  const miss = Math.hypot(
    from.l + share * l - lab.l,
    from.a + share * a - lab.a,
    from.b + share * b - lab.b,
  );
  return { share, miss, length: Math.sqrt(square) };
}

/** One order for a pair, so that a slow change of tone does not turn the pattern over halfway. */
function inOrderOfLight(
  palette: Palette,
  { first, second, share }: { first: number; second: number; share: number },
): Mix {
  const [one, other] = [palette[first], palette[second]];
  if (!one || !other) return { darker: first, lighter: second, lighterShare: share };
  const odds = share * other.weight;
  const weighed = odds === 0 ? 0 : odds / (odds + (1 - share) * one.weight);
  return other.lab.l >= one.lab.l
    ? { darker: first, lighter: second, lighterShare: weighed }
    : { darker: second, lighter: first, lighterShare: 1 - weighed };
}

/** Floyd and Steinberg's shares (Proc. SID 17, 1976; from memory), from the top course down. */
const SHARES: readonly Share[] = [
  { across: 1, down: 0, share: 7 / 16 },
  { across: -1, down: 1, share: 3 / 16 },
  { across: 0, down: 1, share: 5 / 16 },
  { across: 1, down: 1, share: 1 / 16 },
];

/** At the last stave the next tile of the course is laid already: all goes down, or its tone would be lost. */
const SHARES_AT_SEAM: readonly Share[] = SHARES.filter(({ down }) => down === 1).map((each) => ({
  ...each,
  share: (each.share * 16) / 9,
}));

interface Share {
  readonly across: number;
  readonly down: number;
  readonly share: number;
}

/**
 * What is carried never grows beyond this share of the palette's own extent. Between colours that the woods
 * can mix it stays below by itself; beyond them it would grow for ever and smear what lies below.
 */
const CARRIED_MOST = 0.75;

const CHANNELS = ['l', 'a', 'b'] as const;

function diffused(wished: readonly Lab65[], palette: Palette, { staves, courses }: Grid): number[] {
  const extents = CHANNELS.map((channel) => extentOf(palette, channel));
  const carried = CHANNELS.map(() => new Float64Array(wished.length));
  const chosen = new Array<number>(wished.length).fill(0);
  for (let course = courses - 1; course >= 0; course--) {
    for (let stave = 0; stave < staves; stave++) {
      const tile = course * staves + stave;
      const wishes = wishesOf(wished[tile], carried, extents, tile);
      const wood = nearest(palette, wishes.withCarried, EVENLY);
      chosen[tile] = wood;
      carryOn(carried, missedBy(palette, wood, wishes), tile, staves);
    }
  }
  return chosen;
}

interface Wishes {
  /** A tile's colour brought within what the woods span. */
  readonly own: Lab65;
  /** The same with what was carried to it. */
  readonly withCarried: Lab65;
}

/**
 * The error to carry on. The heavier a wood, the less its own misses count, so it is laid more often before
 * others make up for it: that is what multiplies its odds.
 */
function missedBy(palette: Palette, wood: number, { own, withCarried }: Wishes): number[] {
  const laid = palette[wood];
  if (!laid) return [];
  const counts = Math.min(...palette.map(({ weight }) => weight)) / laid.weight;
  return CHANNELS.map(
    (channel) => withCarried[channel] - own[channel] + counts * (own[channel] - laid.lab[channel]),
  );
}

interface Extent {
  readonly least: number;
  readonly most: number;
}

function extentOf(palette: Palette, channel: 'l' | 'a' | 'b'): Extent {
  const values = palette.map(({ lab }) => lab[channel]);
  return { least: Math.min(...values), most: Math.max(...values) };
}

function wishesOf(
  lab: Lab65 | undefined,
  carried: readonly Float64Array[],
  extents: readonly Extent[],
  tile: number,
): Wishes {
  const own: Lab65 = { mode: 'lab65', l: 0, a: 0, b: 0 };
  const withCarried = { ...own };
  CHANNELS.forEach((channel, i) => {
    const { least, most } = extents[i] ?? { least: 0, most: 0 };
    const bound = CARRIED_MOST * (most - least);
    own[channel] = Math.min(most, Math.max(least, lab?.[channel] ?? 0));
    const kept = Math.min(bound, Math.max(-bound, carried[i]?.[tile] ?? 0));
    withCarried[channel] = own[channel] + kept;
  });
  return { own, withCarried };
}

function carryOn(
  carried: readonly Float64Array[],
  missed: readonly number[],
  tile: number,
  staves: number,
): void {
  const stave = tile % staves;
  const shares = stave === staves - 1 ? SHARES_AT_SEAM : SHARES;
  for (const { across, down, share } of shares) {
    const heir = tile - stave - down * staves + ((stave + across + staves) % staves);
    if (heir < 0) continue;
    carried.forEach((channel, i) => {
      channel[heir] = (channel[heir] ?? 0) + (missed[i] ?? 0) * share;
    });
  }
}
