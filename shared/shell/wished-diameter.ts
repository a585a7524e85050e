/**
 * Starting from a wished diameter: which rings leave enough wood to turn to it. The flats must lie at least
 * the skim allowance outside the turned circle: a_o = w / (2 tan β) ≥ D/2 + s, with β = 180°/N.
 */
import type { Scheme } from '../joint/parameters';
import { BOUNDS } from '../layout/schema';
import { toRadians } from '../units/angle';
import type { Millimetres } from '../units/length';
import { closingOf } from './closing';
import { ringOf } from './ring';

export interface DiameterWish {
  /** Turned outside to this. */
  readonly outerDiameter: Millimetres;
  /** Wall after turning. */
  readonly wall: Millimetres;
  readonly skimAllowance: Millimetres;
  /** How far the stave joint stands out. */
  readonly reach: Millimetres;
  readonly boardThickness: Millimetres;
  /** Alternating tabs close only round an even number of staves, so no odd ring is offered for them. */
  readonly scheme: Scheme;
}

/** A ring that can be turned to the wished diameter. */
export interface RingProposal {
  readonly staves: number;
  readonly tileWidth: Millimetres;
  readonly acrossFlats: Millimetres;
  /** What turning takes off the middle of each stave. */
  readonly turnedAway: Millimetres;
  readonly boardLeast: Millimetres;
  /** The board at hand, or the next half millimetre that is thick enough. */
  readonly boardThickness: Millimetres;
  /** Play the two last joints need. */
  readonly play: Millimetres;
}

const OFFERED = 5;

/** Rings of tiles this wide, fewest staves (and least wood turned away) first; empty when none is large enough. */
export function ringsOfWidth(wish: DiameterWish, tileWidth: Millimetres): RingProposal[] {
  const least = Math.ceil(Math.PI / Math.atan(tileWidth / apothemNeeded(wish) / 2) - 1e-9);
  const from = Math.max(BOUNDS.staves.least, least);
  const counts = Array.from({ length: 2 * OFFERED }, (_, i) => from + i);
  return counts
    .filter((staves) => staves <= BOUNDS.staves.most)
    .filter((staves) => wish.scheme === 'one-way' || staves % 2 === 0)
    .map((staves) => proposalOf(wish, staves, tileWidth))
    .filter((proposal) => proposal !== null)
    .slice(0, OFFERED);
}

/** Rings of this many staves, from the narrowest tile that is wide enough in steps of half a millimetre. */
export function ringsOfStaves(wish: DiameterWish, staves: number): RingProposal[] {
  const needed = 2 * apothemNeeded(wish) * Math.tan(toRadians(180 / staves));
  const least = Math.ceil(needed * 2 - 1e-9) / 2;
  return Array.from({ length: OFFERED }, (_, i) => least + i / 2)
    .filter((width) => width >= BOUNDS.tile.least && width <= BOUNDS.tile.most)
    .map((width) => proposalOf(wish, staves, width))
    .filter((proposal) => proposal !== null);
}

function apothemNeeded(wish: DiameterWish): Millimetres {
  return wish.outerDiameter / 2 + wish.skimAllowance;
}

function proposalOf(
  wish: DiameterWish,
  staves: number,
  tileWidth: Millimetres,
): RingProposal | null {
  const { outerDiameter, wall, skimAllowance, reach } = wish;
  const sizes = {
    staves,
    tileWidth,
    skimAllowance,
    finishedOuterDiameter: outerDiameter,
    finishedInnerDiameter: outerDiameter - 2 * wall,
  };
  const { acrossFlats, boardLeast, turnedAway } = ringOf(sizes, reach);
  if (!Number.isFinite(boardLeast) || boardLeast > BOUNDS.board.most) return null;
  const boardThickness = Math.max(wish.boardThickness, Math.ceil(boardLeast * 2 - 1e-9) / 2);
  const { play } = closingOf({ staves, boardThickness });
  return { staves, tileWidth, acrossFlats, turnedAway, boardLeast, boardThickness, play };
}
