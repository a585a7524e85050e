/**
 * Text as a DXF string: printable ASCII on one line. Everything a reader would take for a code is written
 * as itself: `%%d` (a degree sign), `^J` (a line break), `\U+0041` and `\P`. Other characters go as
 * \U+XXXX (Autodesk DXF Reference, "Unicode strings"); those beyond U+FFFF have no such code and become "?".
 */
export function dxfText(text: string): string {
  return Array.from(text.replace(/%(?=%)/g, '% '), dxfCharacter).join('');
}

function dxfCharacter(character: string): string {
  const code = character.codePointAt(0) ?? 0;
  if (code < 0x20 || (code >= 0x7f && code < 0xa0) || isLineBreak(code)) return ' ';
  if (code > 0xffff || isSurrogate(code)) return '?';
  if (code > 0x7e || character === '\\' || character === '^') return unicodeCode(code);
  return character;
}

function unicodeCode(code: number): string {
  return `\\U+${code.toString(16).toUpperCase().padStart(4, '0')}`;
}

function isLineBreak(code: number): boolean {
  return code === 0x2028 || code === 0x2029;
}

function isSurrogate(code: number): boolean {
  return code >= 0xd800 && code <= 0xdfff;
}
