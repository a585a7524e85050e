import { describe, expect, it } from 'vitest';
import { dxfText } from './dxf-text';

describe('text in DXF', () => {
  it('plain names stay as they are', () => {
    expect(dxfText('01 White ash, 12 × 2'.replace('×', 'x'))).toBe('01 White ash, 12 x 2');
  });

  it('codes lose their meaning', () => {
    expect(dxfText('%%d')).toBe('% %d');
    expect(dxfText('%%%%u')).toBe('% % % %u');
    expect(dxfText('100 %')).toBe('100 %');
    expect(dxfText('a^Jb')).toBe('a\\U+005EJb');
    expect(dxfText('\\U+0041')).toBe('\\U+005CU+0041');
  });

  it('line breaks and control characters become spaces, so no group can be forged', () => {
    expect(dxfText('a\r\n0\nEOF\u0000\u0085\u2028')).toBe('a  0 EOF   ');
  });

  it('other scripts are coded, and what has no code becomes a question mark', () => {
    expect(dxfText('Érable œ 木')).toBe('\\U+00C9rable \\U+0153 \\U+6728');
    expect(dxfText('🪵\ud800')).toBe('??');
  });
});
