import { describe, expect, it } from 'vitest';
import type { Layout } from '@shared/layout/schema';
import { startingLayout } from '@shared/layout/starting-layout';
import { buildBundle, bundleZip, type BundleOptions } from './bundle';

const layout = startingLayout('Test ring');
const options: BundleOptions = { dxf: 'r12', unit: 'mm', centrePath: false, version: null };
const odd: Layout = {
  ...layout,
  shell: { ...layout.shell, staves: 25 },
  cells: new Uint8Array(25 * 8),
};

describe('a bundle', () => {
  it('holds manifest, layout, cut list, map and two files a piece kind, in this order', () => {
    const result = buildBundle(layout, options);
    const paths = result.ok ? result.bundle.files.map((file) => file.path) : [];
    expect(paths).toEqual([
      ...['manifest.json', 'layout.json', 'cut-list.csv', 'pattern.svg'],
      ...['outlines/01-maple.svg', 'outlines/01-maple.dxf'],
      ...['outlines/02-maple.svg', 'outlines/02-maple.dxf'],
      ...['outlines/03-maple.svg', 'outlines/03-maple.dxf'],
      ...['outlines/04-maple.svg', 'outlines/04-maple.dxf'],
    ]);
  });

  it('is refused by a stop, with every check', () => {
    const result = buildBundle(odd, options);
    expect(result.ok).toBe(false);
    if (!result.ok) expect(result.checks.map((check) => check.key)).toContain('seam');
  });

  it('goes on with a written reason', () => {
    const override = { who: 'Runa Halvorsen', reason: 'only a test of the cutter' };
    const result = buildBundle(odd, { ...options, override });
    expect(result.ok && result.bundle.files[0]?.text).toContain('"reason": "only a test of');
  });

  it('has a centre path on its own layer only when asked for', () => {
    const without = buildBundle(layout, options);
    const asked = buildBundle(layout, { ...options, centrePath: true });
    const textOf = (result: typeof asked) =>
      result.ok ? (result.bundle.files[5]?.text ?? '') : '';
    expect(textOf(without)).not.toContain('CENTRE_PATH');
    expect(textOf(asked)).toContain('CENTRE_PATH');
  });

  it('is the same ZIP for the same layout and options', () => {
    const [one, other] = [buildBundle(layout, options), buildBundle(layout, options)];
    if (!one.ok || !other.ok) throw new Error('the starting layout was stopped');
    expect(bundleZip(one.bundle)).toEqual(bundleZip(other.bundle));
  });
});
