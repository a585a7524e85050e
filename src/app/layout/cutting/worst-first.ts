import { RESULTS, type CheckResult } from '@shared/checks/check';

/** The checks with stops first, then cautions, then what is clear; otherwise in their own order. */
export function worstFirst(checks: readonly CheckResult[]): CheckResult[] {
  const badness = (check: CheckResult) => RESULTS.indexOf(check.result);
  return [...checks].sort((a, b) => badness(b) - badness(a));
}
