import { describe, expect, it } from 'vitest';
import { bundleName } from './bundle-name';

describe('the name of a downloaded bundle', () => {
  it('is the title and the version', () => {
    expect(bundleName('Ferry-hall lantern', 7)).toBe('ferry-hall-lantern-v7.zip');
  });

  it('leaves out what a file system minds', () => {
    expect(bundleName('../=A "b" <c>|d?', 1)).toBe('a-b-c-d-v1.zip');
    expect(bundleName('Tambour d’été', 2)).toBe('tambour-d-ete-v2.zip');
  });

  it('keeps letters of other scripts and never comes out empty', () => {
    expect(bundleName('灯籠', 3)).toBe('灯籠-v3.zip');
    expect(bundleName('***', 3)).toBe('layout-v3.zip');
  });

  it('stays short', () => {
    expect(bundleName('x'.repeat(120), 12)).toHaveLength(60 + '-v12.zip'.length);
  });
});
