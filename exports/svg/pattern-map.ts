import type { Layout } from '@shared/layout/schema';
import type { Millimetres } from '@shared/units/length';

/** Sizes of the map, mm. */
export interface MapSize {
  readonly width: Millimetres;
  readonly height: Millimetres;
  /** Between the tiles and what stands around them. */
  readonly margin: Millimetres;
  /** Height of the letters at the edges. */
  readonly letter: Millimetres;
  /** Side of the square in a tile's middle that no socket reaches into. */
  readonly core: Millimetres;
  /** Width of a thin line. */
  readonly line: Millimetres;
}

/** The sizes of a layout's map, as shares of its tiles. */
export function mapSize({ shell, joint }: Pick<Layout, 'shell' | 'joint'>): MapSize {
  const least = Math.min(shell.tileWidth, shell.tileHeight);
  const reach = Math.max(joint.staveJoint.reach, joint.courseJoint.reach);
  const letter = 0.36 * least;
  const clear = Math.min(
    shell.tileWidth - 2 * joint.staveJoint.reach,
    shell.tileHeight - 2 * joint.courseJoint.reach,
  );
  return {
    width: shell.staves * shell.tileWidth,
    height: shell.courses * shell.tileHeight,
    margin: reach + 3 * letter,
    letter,
    core: Math.max(clear, least / 5),
    line: least / 120,
  };
}
