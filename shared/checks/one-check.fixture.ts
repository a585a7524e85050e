import type { Layout } from '../layout/schema';
import { smallLayout } from '../layout/small-layout.fixture';
import type { CheckKey, CheckResult, CheckSettings } from './check';
import { runChecks } from './run-checks';

/** What may differ from a layout that is clear in every check. */
export interface Changes {
  readonly shell?: Partial<Layout['shell']>;
  readonly joint?: Partial<Layout['joint']>;
  readonly cutter?: Partial<Layout['cutter']>;
}

/** A ring of 32 × 9 tiles of 28 mm, clear in every check, with some things changed. */
export function lantern({ shell, joint, cutter }: Changes = {}): Layout {
  const small = smallLayout();
  const size = {
    staves: 32,
    courses: 9,
    tileWidth: 28,
    tileHeight: 28,
    finishedOuterDiameter: 280,
    finishedInnerDiameter: 262,
    finishedHeight: 238,
    boardThickness: 14,
    skimAllowance: 0.5,
    ...shell,
  };
  return {
    ...small,
    shell: size,
    joint: { ...small.joint, ...joint },
    cutter: { diameter: 3.175, fluteLength: 16, ...cutter },
    cells: new Uint8Array(size.staves * size.courses),
  };
}

/** What one check finds in that ring. */
export function found(key: CheckKey, changes: Changes, settings: CheckSettings = {}): CheckResult {
  const result = runChecks(lantern(changes), settings).find((check) => check.key === key);
  if (!result) throw new Error(`There is no check ${key}.`);
  return result;
}
