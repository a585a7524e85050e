/** A file's name made of what people call the layout: letters and digits, words joined by hyphens. */
export function layoutFileName(name: string, suffix: string): string {
  const words = name
    .normalize('NFKD')
    .replace(/\p{M}/gu, '')
    .toLowerCase()
    .match(/[\p{L}\p{N}]+/gu);
  return `${(words ?? ['layout']).join('-').slice(0, 80)}${suffix}`;
}
