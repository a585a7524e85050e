import type { CheckResult } from '@shared/checks/check';

/** One line about a check: its result, key and finding, and what to change when it is not clear. */
export function checkLine(check: CheckResult): string {
  const sentences = [check.finding, check.result === 'clear' ? '' : check.remedy];
  const said = sentences.filter((sentence) => sentence !== '').join(' ');
  return `${check.result.padEnd(7)}  ${check.key.padEnd(13)}  ${said}`;
}
