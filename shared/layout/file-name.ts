/** So many letters, of up to four bytes each, leave the suffix room in the 255 bytes of a file's name. */
const LETTERS_MOST = 60;

/** A file's name made of what people call the layout: letters and digits, words joined by hyphens. */
export function layoutFileName(name: string, suffix: string): string {
  const words = name
    .normalize('NFKD')
    .replace(/\p{M}/gu, '')
    .toLowerCase()
    .match(/[\p{L}\p{N}]+/gu);
  // cut by letters: half of one made of two code units cannot be sent in a header
  const letters = Array.from((words ?? ['layout']).join('-')).slice(0, LETTERS_MOST);
  return `${letters.join('').replace(/-$/, '')}${suffix}`;
}
