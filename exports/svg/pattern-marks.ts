import { luminanceOf } from '@shared/wood/luminance';
import { printDecimal } from '../decimal';
import { element, type Markup } from './xml';

export const LINE_COLOUR = '#2b211a';
export const SEAM_COLOUR = '#0b4f9c';
export const TRIM_COLOUR = '#b3261e';

/** A number of the map: a ten-thousandth of a millimetre is finer than any printer. */
export function patternDecimal(value: number): string {
  return printDecimal(value, 4);
}

/** A bar under a tile's number: this tile lies face down on the machine. `core` is the room it has, mm. */
export function faceDownMark(core: number, ink: string): Markup {
  return element('rect', {
    x: patternDecimal(-0.3 * core),
    y: patternDecimal(0.44 * core),
    width: patternDecimal(0.6 * core),
    height: patternDecimal(0.07 * core),
    fill: ink,
  });
}

/** Black or white, whichever is read better on a colour "#RRGGBB" (relative luminance, WCAG 2.2). */
export function inkOn(colour: string): string {
  return luminanceOf(colour) > 0.179 ? '#000000' : '#ffffff';
}
