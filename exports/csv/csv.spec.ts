import { describe, expect, it } from 'vitest';
import { printCsv } from './csv';

const printed = (...cells: (string | number)[]) => printCsv([cells]).slice(1);

describe('comma-separated values', () => {
  it('rows end in CR LF behind a byte order mark', () => {
    expect(
      printCsv([
        ['kind', 'wood'],
        [1, 'ash'],
      ]),
    ).toBe('\ufeffkind,wood\r\n1,ash\r\n');
  });

  it('commas and quotes are quoted', () => {
    expect(printed('A 1, A 3', 'a "b"', ' c')).toBe('"A 1, A 3","a ""b"""," c"\r\n');
  });

  it.each(['=cmd()', '+1', '-1', '@SUM', ' =1', '＝1', '＠x'])(
    '%s is text, not a formula',
    (name) => {
      const cell = printed(name).replace(/^"|"?\r\n$/g, '');
      expect(cell).toBe(`'${name}`);
    },
  );

  it('a semicolon begins no formula either, where a spreadsheet takes it for the comma', () => {
    expect(printed('ash;=cmd(); @SUM;-')).toBe("ash;'=cmd();' @SUM;'-\r\n");
  });

  it('tabs, line breaks and control characters never reach a cell', () => {
    expect(printed('a\t=1\r\n=2\u0000b')).toBe('a =1 =2 b\r\n');
    expect(printed('\t=1')).toBe("' =1\r\n");
  });

  it('figures are printed as they are', () => {
    expect(printed(-1.5, 40)).toBe('-1.5,40\r\n');
  });
});
