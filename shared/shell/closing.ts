/**
 * Closing the ring. A joined stave slides on along its joint's radial direction, so two joints can close at
 * once only when they are diametrically opposite. An arc of m staves closing against the rest needs sideways
 * play of t · tan(|180° − 360° m / N| / 2) on each flank over wall t: none for two halves of an even ring,
 * t · tan(90°/N) for the best that an odd ring allows.
 */
import type { Shell } from '../layout/schema';
import { toRadians } from '../units/angle';
import type { Millimetres } from '../units/length';

/** A run of staves, numbered from 1, both ends included. */
export interface StaveRun {
  readonly from: number;
  readonly to: number;
}

/** A stave joint, by the numbers of its two staves. */
export type StaveJoint = readonly [number, number];

export interface Closing {
  /** Sideways play each of the two last joints needs. */
  readonly play: Millimetres;
  /** The two parts the ring is built as, the smaller first. */
  readonly parts: readonly [StaveRun, StaveRun];
  /** Joints that stay dry until the end: where the two parts meet. */
  readonly dryJoints: readonly [StaveJoint, StaveJoint];
}

/** Play needed to close an arc of m staves against the rest of a ring of N over a wall of thickness t. */
export function playNeeded(staves: number, arcStaves: number, wall: Millimetres): Millimetres {
  const misfit = Math.abs(180 - (360 * arcStaves) / staves);
  return wall * Math.tan(toRadians(misfit / 2));
}

/** The best way to close the ring: the wall is the board, since the ring is glued before it is turned. */
export function closingOf(shell: Pick<Shell, 'staves' | 'boardThickness'>): Closing {
  const { staves, boardThickness } = shell;
  const half = Math.floor(staves / 2);
  return {
    play: playNeeded(staves, half, boardThickness),
    parts: [
      { from: 1, to: half },
      { from: half + 1, to: staves },
    ],
    dryJoints: [
      [half, half + 1],
      [staves, 1],
    ],
  };
}

/** One step of gluing up the ring. */
export interface AssemblyStep {
  readonly kind: 'glue-part' | 'dry-fit' | 'close';
  readonly staves: StaveRun;
}

/** The order of assembly: each part stave by stave, both tried dry together, then both last joints at once. */
export function assemblyOrder(closing: Closing): AssemblyStep[] {
  const [first, second] = closing.parts;
  const whole = { from: first.from, to: second.to };
  return [
    { kind: 'glue-part', staves: first },
    { kind: 'glue-part', staves: second },
    { kind: 'dry-fit', staves: whole },
    { kind: 'close', staves: whole },
  ];
}
