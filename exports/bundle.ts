/**
 * Everything that leaves the program for one version of a layout. Cost grows with the number of piece
 * kinds; only the map, the cells and the lists of tile names grow with the tiles.
 */
import type { CheckResult, CheckSettings } from '@shared/checks/check';
import { runChecks } from '@shared/checks/run-checks';
import { printLayout } from '@shared/layout/read-layout';
import type { Layout } from '@shared/layout/schema';
import { cutList } from '@shared/pieces/cut-list';
import { cutListCsv } from './csv/cut-list-csv';
import { manifestOf, printManifest, type BundleVersion, type Override } from './manifest';
import { pieceFiles, type PieceFileOptions } from './piece-files';
import { patternSvg } from './svg/pattern-svg';
import { zipFiles, type BundleFile } from './zip/zip-files';

export interface BundleOptions extends PieceFileOptions {
  /** The kept version the layout is, or null for a layout that was never kept. */
  readonly version: BundleVersion | null;
  /** Needed to go on when a check says stop; recorded in the manifest. */
  readonly override?: Override;
  /** What the workshop sets about the checks. */
  readonly settings?: CheckSettings;
}

export interface Bundle {
  /** In the order of the ZIP, manifest.json first; paths with "/". */
  readonly files: readonly BundleFile[];
  readonly checks: readonly CheckResult[];
}

/** A bundle, or the checks with the stops that refuse it. */
export type BundleResult =
  | { readonly ok: true; readonly bundle: Bundle }
  | { readonly ok: false; readonly checks: readonly CheckResult[] };

/** Builds the bundle of a layout that holds together (readLayout has no problem with it). */
export function buildBundle(layout: Layout, options: BundleOptions): BundleResult {
  const checks = runChecks(layout, { lengthUnit: options.unit, ...options.settings });
  const stopped = checks.some((check) => check.result === 'stop');
  if (stopped && options.override === undefined) return { ok: false, checks };
  const list = cutList(layout);
  const kinds = list.rows.map((row) => row.kind);
  const pieces = pieceFiles(layout, kinds, options);
  const files: BundleFile[] = [
    { path: 'layout.json', text: printLayout(layout) },
    { path: 'cut-list.csv', text: cutListCsv(layout, list, options.unit) },
    { path: 'pattern.svg', text: patternSvg(layout, kinds, options.unit) },
    ...pieces.flatMap((piece) => piece.files),
  ];
  const manifest = manifestOf({
    layout,
    version: options.version,
    unit: options.unit,
    checks,
    override: stopped ? (options.override ?? null) : null,
    pieces,
    files,
  });
  const first: BundleFile = { path: 'manifest.json', text: printManifest(manifest) };
  return { ok: true, bundle: { files: [first, ...files], checks } };
}

/** The bundle as one ZIP: the same layout and options always give the same bytes. */
export function bundleZip(bundle: Bundle): Uint8Array {
  return zipFiles(bundle.files);
}
