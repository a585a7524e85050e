import type { Layout } from '../layout/schema';
import { board } from './board';
import type { CheckKey, CheckResult, CheckSettings } from './check';
import { closing } from './closing';
import { checkContext, type Check } from './context';
import { contrastOfLayout } from './contrast';
import { flute } from './flute';
import { insideRadius } from './inside-radius';
import { neck } from './neck';
import { reachIn } from './reach-in';
import { seam } from './seam';
import { trim } from './trim';
import { undercut } from './undercut';
import { web } from './web';

/** In the order of `CHECK_KEYS`. */
const SHAPE_CHECKS: Readonly<Record<Exclude<CheckKey, 'contrast'>, Check>> = {
  'inside-radius': insideRadius,
  'reach-in': reachIn,
  flute,
  undercut,
  web,
  neck,
  board,
  trim,
  seam,
  closing,
};

/** Every check of a layout that holds together, in the order of `CHECK_KEYS`. */
export function runChecks(layout: Layout, settings: CheckSettings = {}): CheckResult[] {
  return [...runShapeChecks(layout, settings), contrastOfLayout(layout)];
}

/**
 * The checks of shell, joint and cutter. None of them looks at the pattern, so laying tiles never changes a
 * result.
 */
export function runShapeChecks(layout: Layout, settings: CheckSettings = {}): CheckResult[] {
  const context = checkContext(layout, settings);
  return Object.values(SHAPE_CHECKS).map((check) => check(context));
}
