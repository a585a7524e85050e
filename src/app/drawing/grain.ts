/** Grain as it is drawn: lines along the stave, always the same ones for the same colour. */

/** One line of grain across a strip of wood one unit wide. */
export interface GrainLine {
  /** Where its middle lies, 0 to 1 across the grain. */
  readonly at: number;
  /** How wide it is, as a share of the strip. */
  readonly width: number;
  /** How strongly it darkens (or, below zero, lightens) the wood, −1 to 1. */
  readonly depth: number;
}

const LINES = 22;

/**
 * Lines for a wood of this colour ("#DCC39A"), from left to right. The strip can be laid side by side:
 * no line reaches over its edge.
 */
export function grainOf(colour: string): readonly GrainLine[] {
  const random = randomFrom(colour);
  return Array.from({ length: LINES }, (_, index) => {
    const width = 0.005 + 0.014 * random() ** 2;
    const at = (index + 0.15 + 0.7 * random()) / LINES;
    const depth = random() < 0.2 ? -0.05 - 0.05 * random() : 0.06 + 0.1 * random();
    return { at: Math.min(Math.max(at, width / 2), 1 - width / 2), width, depth };
  });
}

/** The colour a grain line is drawn with over its wood: black or white, thinned out. */
export function grainColour(line: GrainLine): string {
  const shade = line.depth < 0 ? 255 : 0;
  return `rgb(${shade} ${shade} ${shade} / ${(Math.abs(line.depth) * 100).toFixed(1)}%)`;
}

/** Numbers from 0 to 1 that follow from the text alone (FNV-1a as seed, then xorshift). */
function randomFrom(text: string): () => number {
  let state = 0x811c9dc5;
  for (let index = 0; index < text.length; index++) {
    state = Math.imul(state ^ text.toUpperCase().charCodeAt(index), 0x01000193);
  }
  state ||= 1;
  return () => {
    state ^= state << 13;
    state ^= state >>> 17;
    state ^= state << 5;
    return (state >>> 0) / 0x1_0000_0000;
  };
}
