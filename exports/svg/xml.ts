/**
 * The few lines of XML the drawings need: elements whose attributes and text are always escaped, so that
 * no name can become markup. What XML 1.0 cannot carry at all (control characters, lone surrogates) is
 * replaced by U+FFFD.
 */

/** Markup that is already escaped; only `element` and `textNode` make it. */
export interface Markup {
  readonly markup: string;
}

/** Attribute values; an undefined one is left out. */
export type Attributes = Readonly<Record<string, string | number | undefined>>;

/** An element with escaped attributes; its children stand one after another. */
export function element(
  name: string,
  attributes: Attributes = {},
  children: readonly Markup[] = [],
): Markup {
  const open = `<${name}${attributesText(attributes)}`;
  if (children.length === 0) return { markup: `${open}/>` };
  return { markup: `${open}>${children.map((child) => child.markup).join('')}</${name}>` };
}

/** Escaped text. */
export function textNode(text: string): Markup {
  return { markup: escapeXml(text) };
}

/** An element holding only text. */
export function textElement(name: string, text: string, attributes: Attributes = {}): Markup {
  return element(name, attributes, [textNode(text)]);
}

/** The element as a file: XML declaration, markup, a line break at the end. */
export function xmlFile(root: Markup): string {
  return `<?xml version="1.0" encoding="UTF-8"?>\n${root.markup}\n`;
}

function attributesText(attributes: Attributes): string {
  return Object.entries(attributes)
    .filter(([, value]) => value !== undefined)
    .map(([name, value]) => ` ${name}="${escapeXml(String(value))}"`)
    .join('');
}

const NOT_XML = /[\u0000-\u001f\u007f-\u009f\ud800-\udfff\ufffe\uffff]/gu;
const ENTITIES: Readonly<Record<string, string>> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&apos;',
};

function escapeXml(text: string): string {
  return text.replace(NOT_XML, '\ufffd').replace(/[&<>"']/g, (found) => ENTITIES[found] ?? found);
}
