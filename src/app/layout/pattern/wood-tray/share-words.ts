/** The share of some tiles in all of them, in whole percent that never call some none or most all. */
export function shareWords(tiles: number, all: number): string {
  const percent = all > 0 ? (100 * tiles) / all : 0;
  if (percent > 0 && percent < 1) return 'under 1 %';
  if (percent > 99 && percent < 100) return 'over 99 %';
  return `${Math.round(percent)} %`;
}
