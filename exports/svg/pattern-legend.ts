import type { Layout } from '@shared/layout/schema';
import type { PieceKind } from '@shared/pieces/piece-kind';
import { trimOf } from '@shared/shell/trim';
import { formatLength } from '@shared/units/format';
import type { LengthUnit } from '@shared/units/length';
import {
  faceDownMark,
  LINE_COLOUR,
  patternDecimal as decimal,
  SEAM_COLOUR,
  TRIM_COLOUR,
} from './pattern-marks';
import { element, textElement, type Markup } from './xml';

/** The legend under the map, its top left corner at the origin. */
export interface PatternLegend {
  readonly markup: Markup;
  readonly width: number;
  readonly height: number;
}

/** A line of the legend: what is drawn, and what it says. */
interface Entry {
  readonly sign: Markup;
  readonly text: string;
}

/** Width of an average letter of a sans serif face, as a share of its height; on the safe side. */
const LETTER_WIDTH = 0.62;

/** What the colours, numbers and lines of the map mean; `letter` is the height of its letters, mm. */
export function patternLegend(
  layout: Layout,
  kinds: readonly PieceKind[],
  letter: number,
  unit: LengthUnit,
): PatternLegend {
  const entries = [
    ...woodEntries(layout, kinds, letter),
    ...lineEntries(layout, kinds, letter, unit),
  ];
  const row = 1.5 * letter;
  const longest = Math.max(...entries.map(({ text }) => Array.from(text).length));
  return {
    width: 2 * letter + longest * LETTER_WIDTH * letter,
    height: (entries.length + 0.5) * row,
    markup: element(
      'g',
      { 'text-anchor': 'start' },
      entries.map(({ sign, text }, index) =>
        element('g', { transform: `translate(0 ${decimal((index + 0.5) * row)})` }, [
          sign,
          textElement('text', text, { x: decimal(2 * letter), y: decimal(0.35 * letter) }),
        ]),
      ),
    ),
  };
}

function woodEntries({ woods }: Layout, kinds: readonly PieceKind[], letter: number): Entry[] {
  return woods.flatMap((wood, index) => {
    const own = kinds.filter((kind) => kind.wood === index);
    if (own.length === 0) return [];
    const tiles = own.reduce((sum, kind) => sum + kind.count, 0);
    const numbers = own.map((kind) => kind.number).join(', ');
    const sign = element('rect', {
      y: decimal(-0.5 * letter),
      width: decimal(1.4 * letter),
      height: decimal(letter),
      fill: wood.colour,
      stroke: LINE_COLOUR,
      'stroke-width': decimal(letter / 40),
    });
    const kindsText = own.length === 1 ? 'kind' : 'kinds';
    return [
      {
        sign,
        text: `${wood.name}: ${tiles} ${tiles === 1 ? 'tile' : 'tiles'}, ${kindsText} ${numbers}`,
      },
    ];
  });
}

function lineEntries(
  { shell }: Layout,
  kinds: readonly PieceKind[],
  letter: number,
  unit: LengthUnit,
): Entry[] {
  const { eachEnd } = trimOf(shell);
  const faceDown = kinds.some((kind) => kind.faceDown.length > 0);
  const number = textElement('text', '1', { x: decimal(0.4 * letter), y: decimal(0.35 * letter) });
  const place = `translate(${decimal(0.7 * letter)} ${decimal(-0.45 * letter)})`;
  const bar = element('g', { transform: place }, [faceDownMark(letter, LINE_COLOUR)]);
  return [
    { sign: number, text: 'Number in a tile: its piece kind' },
    ...(faceDown ? [{ sign: bar, text: 'Bar under it: lies face down when it is cut' }] : []),
    { sign: lineSign(letter, SEAM_COLOUR), text: 'Seam: the last stave meets stave 1' },
    ...(eachEnd > 0
      ? [
          {
            sign: lineSign(letter, TRIM_COLOUR),
            text: `Trim line: ${formatLength(eachEnd, unit)} comes off each end`,
          },
        ]
      : []),
  ];
}

function lineSign(letter: number, stroke: string): Markup {
  const dashed = stroke === TRIM_COLOUR;
  return element('path', {
    d: `M0 0H${decimal(1.4 * letter)}`,
    stroke,
    'stroke-width': decimal(letter / 10),
    'stroke-dasharray': dashed ? `${decimal(0.4 * letter)} ${decimal(0.2 * letter)}` : undefined,
  });
}
