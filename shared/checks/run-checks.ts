import type { Layout } from '../layout/schema';
import { board } from './board';
import { CHECK_KEYS, type CheckKey, type CheckResult, type CheckSettings } from './check';
import { closing } from './closing';
import { checkContext, type Check } from './context';
import { flute } from './flute';
import { insideRadius } from './inside-radius';
import { neck } from './neck';
import { reachIn } from './reach-in';
import { seam } from './seam';
import { trim } from './trim';
import { undercut } from './undercut';
import { web } from './web';

const CHECKS: Readonly<Record<CheckKey, Check>> = {
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

/**
 * Every check of a layout that holds together, in the order of `CHECK_KEYS`. None of them looks at the
 * pattern, so laying tiles never changes a result.
 */
export function runChecks(layout: Layout, settings: CheckSettings = {}): CheckResult[] {
  const context = checkContext(layout, settings);
  return CHECK_KEYS.map((key) => CHECKS[key](context));
}
