import { describe, expect, it } from 'vitest';
import { fileNameIn } from './downloads';

describe('the name of a downloaded file', () => {
  it('the encoded name wins over the plain one', () => {
    expect(fileNameIn(`attachment; filename="lantern.json"; filename*=UTF-8''L%C3%A4mp.json`)).toBe(
      'Lämp.json',
    );
  });

  it('a quoted name may hold quotes', () => {
    expect(fileNameIn('attachment; filename="the \\"tall\\" one.json"')).toBe(
      'the "tall" one.json',
    );
  });

  it('a plain word needs no quotes', () => {
    expect(fileNameIn('attachment; filename=rehearsal-floor-drum.json')).toBe(
      'rehearsal-floor-drum.json',
    );
  });

  it('no header, or one without a name, gives none', () => {
    expect(fileNameIn(null)).toBeNull();
    expect(fileNameIn('attachment')).toBeNull();
  });
});
