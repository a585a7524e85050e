import type { ValidatorFn } from '@angular/forms';

/** Refuses text that is not a figure within the bounds, inclusive: `{ figure: sentence }`. */
export function figureWithin(
  bounds: { readonly least: number; readonly most: number },
  { whole }: { readonly whole: boolean },
): ValidatorFn {
  const { least, most } = bounds;
  const sentence = `Must be a ${whole ? 'whole ' : ''}number from ${least} to ${most}.`;
  return ({ value }) => {
    const text = String(value).trim();
    const figure = Number(text);
    const right = text !== '' && figure >= least && figure <= most;
    return right && (!whole || Number.isInteger(figure)) ? null : { figure: sentence };
  };
}
