/**
 * How far apart two woods look: CIEDE2000 (Sharma, Wu, Dalal, Color Res. Appl. 30(1), 2005) over CIELAB under
 * D65, computed by culori. Woods under ΔE 10 as finished hardly tell apart across a room: common practice,
 * no source.
 */
import { differenceCiede2000, modeLab65, modeRgb, parseHex, useMode, type Lab65 } from 'culori/fn';

useMode(modeRgb);
const toLab65 = useMode(modeLab65);
const difference = differenceCiede2000();

/** A colour "#DCC39A" in CIELAB under D65. */
export function labOf(colour: string): Lab65 {
  return toLab65(parseHex(colour)) ?? { mode: 'lab65', l: 0, a: 0, b: 0 };
}

/** Red, green and blue from 0 to 255 in CIELAB under D65. */
export function labOfRgb(red: number, green: number, blue: number): Lab65 {
  return toLab65({ mode: 'rgb', r: red / 255, g: green / 255, b: blue / 255 });
}

/** ΔE00 of two colours in CIELAB. */
export function colourDifference(a: Lab65, b: Lab65): number {
  return difference(a, b);
}

/** ΔE00 of two colours given as "#RRGGBB". */
export function contrastOf(colour: string, other: string): number {
  return difference(labOf(colour), labOf(other));
}
