import { SaxesParser } from 'saxes';

/** What a strict XML 1.0 parser (saxes) has to say against a text; empty when it is well-formed. */
export function xmlErrors(text: string): string[] {
  const errors: string[] = [];
  const parser = new SaxesParser({ xmlns: true });
  parser.on('error', (error) => errors.push(error.message));
  parser.write(text).close();
  return errors;
}
