/** A stretch of a sentence: plain words, or a figure with its unit. */
export interface SentencePart {
  readonly text: string;
  readonly kind: 'words' | 'figure';
}

const UNITS =
  'mm ⌀|mm|in|°|%|staves|stave|tiles|tile|courses|course|halves|boards|pieces|kinds|blanks|spares|spare|h|min|minutes|times';
const FIGURE = new RegExp(
  String.raw`(?<![\w.])(?:ΔE )?[−-]?\d+(?:[ \u00a0\u202f]\d{3})*(?:\.\d+)?(?:[ \u00a0]?(?:${UNITS})(?![\w]))?(?![\w])`,
  'g',
);

/** The sentence cut into words and figures, in order; joined again it is the sentence. */
export function figuresIn(sentence: string): readonly SentencePart[] {
  const parts: SentencePart[] = [];
  let end = 0;
  for (const match of sentence.matchAll(FIGURE)) {
    if (match.index > end) parts.push({ text: sentence.slice(end, match.index), kind: 'words' });
    parts.push({ text: match[0], kind: 'figure' });
    end = match.index + match[0].length;
  }
  if (end < sentence.length) parts.push({ text: sentence.slice(end), kind: 'words' });
  return parts;
}
