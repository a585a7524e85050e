import { describe, expect, it } from 'vitest';
import { element, textElement, xmlFile } from './xml';

describe('markup', () => {
  it('a name never becomes markup', () => {
    expect(textElement('title', `</title><script>"'&`).markup).toBe(
      '<title>&lt;/title&gt;&lt;script&gt;&quot;&apos;&amp;</title>',
    );
    expect(element('g', { id: `"><script>` }).markup).toBe('<g id="&quot;&gt;&lt;script&gt;"/>');
  });

  it('what XML cannot carry is replaced', () => {
    expect(textElement('t', 'a\u0000b\u001b\ud800c\uffff').markup).toBe(
      '<t>a\ufffdb\ufffd\ufffdc\ufffd</t>',
    );
    expect(textElement('t', '🪵').markup).toBe('<t>🪵</t>');
  });

  it('attributes that are undefined are left out', () => {
    expect(element('use', { x: 0, y: undefined }).markup).toBe('<use x="0"/>');
  });

  it('a file has a declaration and ends with a line break', () => {
    expect(xmlFile(element('svg'))).toBe('<?xml version="1.0" encoding="UTF-8"?>\n<svg/>\n');
  });
});
