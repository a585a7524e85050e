import { buildBundle, bundleZip, type BundleOptions } from '@exports/bundle';
import type { Layout } from '@shared/layout/schema';

export const BENCH_OPTIONS: BundleOptions = {
  ...{ dxf: 'r2000', unit: 'mm', centrePath: false, version: null },
  override: { who: 'the bench', reason: 'only its size matters' },
};

/** The ZIP of a layout's bundle, whatever its checks say. */
export function bundleZipOf(layout: Layout): Uint8Array {
  const result = buildBundle(layout, BENCH_OPTIONS);
  if (!result.ok) throw new Error('stopped in spite of an override');
  return bundleZip(result.bundle);
}
