/**
 * Woods side by side that look alike: CIEDE2000 between their colours as finished. The only check that looks
 * at the pattern.
 */
import { woodsSideBySide, type WoodPair } from '../layout/neighbours';
import type { Layout } from '../layout/schema';
import { inSentence } from '../layout/wood-name';
import { contrastOf } from '../wood/contrast';
import type { CheckResult } from './check';

/** Least ΔE between neighbours: common practice, no source. */
const LEAST_DIFFERENCE = 10;

/** Pairs named in the sentence; the rest are counted. */
const NAMED = 3;

interface Contrast {
  readonly names: string;
  readonly difference: number;
}

/** What is known of the pairs that lie side by side: a caution under ΔE 10, never a stop. */
export function contrast(
  woods: Layout['woods'],
  pairs: readonly WoodPair[],
): CheckResult & { readonly key: 'contrast' } {
  const contrasts = pairs
    .flatMap((pair) => contrastBetween(woods, pair) ?? [])
    .sort((a, b) => a.difference - b.difference);
  const [nearest] = contrasts;
  const blurred = contrasts.filter(({ difference }) => difference < LEAST_DIFFERENCE);
  return {
    key: 'contrast',
    result: blurred.length > 0 ? 'caution' : 'clear',
    station: 'pattern',
    title: 'Contrast',
    figure: nearest ? { value: nearest.difference, kind: 'colour-difference' } : null,
    limit: { value: LEAST_DIFFERENCE, kind: 'colour-difference' },
    finding: blurred.length > 0 ? blurredSentence(blurred) : clearSentence(nearest),
    reason:
      'Under ΔE 10 two woods hardly tell apart across a room, and what was drawn with them is lost.',
    remedy:
      blurred.length > 0
        ? 'Take a darker or a lighter wood for one of them, or lay a third between them.'
        : '',
  };
}

/** The contrast check of a whole layout. */
export function contrastOfLayout({ shell, cells, woods }: Layout): CheckResult {
  return contrast(woods, woodsSideBySide(shell, cells));
}

function contrastBetween(woods: Layout['woods'], { wood, other }: WoodPair): Contrast | null {
  const [one, two] = [woods[wood], woods[other]];
  if (!one || !two) return null;
  return {
    names: `${one.name} and ${inSentence(two.name)}`,
    difference: contrastOf(one.colour, two.colour),
  };
}

function blurredSentence(blurred: readonly Contrast[]): string {
  const named = blurred
    .slice(0, NAMED)
    .map(({ names, difference }, i) =>
      i === 0
        ? `${names} are only ΔE ${figureOf(difference)} apart`
        : `${inSentence(names)} ΔE ${figureOf(difference)}`,
    );
  const rest = blurred.length - named.length;
  const more = rest > 0 ? `, and ${rest} more ${rest === 1 ? 'pair' : 'pairs'} under 10` : '';
  const lines = blurred.length === 1 ? 'the joint line' : 'their joint lines';
  return `${named.join(', ')}${more}: ${lines} will hardly show.`;
}

function clearSentence(nearest: Contrast | undefined): string {
  return nearest
    ? `${nearest.names} are the nearest in look of the woods side by side: ΔE ${figureOf(nearest.difference)} apart.`
    : 'The pattern is all one wood: there is nothing to tell apart.';
}

/** Rounded down, so that what is under the limit never reads as the limit. */
function figureOf(difference: number): string {
  return (Math.floor(difference * 10) / 10).toFixed(1);
}
