import type { Shell } from '../layout/schema';
import { toRadians } from '../units/angle';
import type { Millimetres } from '../units/length';

/**
 * The gap that opens at the outer faces between staves whose edges are cut square instead of bevelled:
 * neighbours meet at the inner faces and turn 2β, so over the board it opens to thickness × 2 tan β,
 * β = 180°/N.
 */
export function outsideGap(shell: Pick<Shell, 'staves' | 'boardThickness'>): Millimetres {
  return shell.boardThickness * 2 * Math.tan(toRadians(180 / shell.staves));
}
