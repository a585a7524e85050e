/** A wood's name inside a sentence: "Black walnut" → "black walnut"; "MDF" stays. */
export function inSentence(name: string): string {
  return /^\p{Lu}\p{Ll}/u.test(name) ? name.charAt(0).toLowerCase() + name.slice(1) : name;
}
