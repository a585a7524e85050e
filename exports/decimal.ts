/**
 * A number as files carry it: at most `decimals` decimals, no exponent, no negative zero, no trailing
 * zeros, a point whatever the locale.
 */
export function printDecimal(value: number, decimals: number): string {
  const fixed = value.toFixed(decimals);
  const short = fixed.includes('.') ? fixed.replace(/\.?0+$/, '') : fixed;
  return short === '-0' ? '0' : short;
}
