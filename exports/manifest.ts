/**
 * The bundle's table of contents for other programs. Every length in it is in `unit`, the unit of the DXF
 * files; there is no time in it, so the same version gives the same bytes.
 */
import { sha256 } from '@noble/hashes/sha2';
import { bytesToHex, utf8ToBytes } from '@noble/hashes/utils';
import type { CheckKey, CheckOutcome, CheckResult, Measure } from '@shared/checks/check';
import { tileName, tileOf } from '@shared/layout/cells';
import type { Layout } from '@shared/layout/schema';
import type { TileEdges } from '@shared/pieces/tile-edges';
import { fromMillimetres, type LengthUnit, type Millimetres } from '@shared/units/length';
import type { CentrePathOutcome, PieceFiles } from './piece-files';
import { PROGRAM } from './program';
import type { BundleFile } from './zip/zip-files';

export const BUNDLE_FORMAT = 'staveloom-bundle';
export const BUNDLE_FORMAT_VERSION = 1;

/** The kept version that a bundle was made from. */
export interface BundleVersion {
  readonly number: number;
  readonly note: string;
}

/** Who goes on in spite of a stop, and why. */
export interface Override {
  readonly who: string;
  readonly reason: string;
}

export interface ManifestContents {
  readonly layout: Layout;
  readonly version: BundleVersion | null;
  readonly unit: LengthUnit;
  readonly checks: readonly CheckResult[];
  /** Null when nothing had to be overridden. */
  readonly override: Override | null;
  readonly pieces: readonly PieceFiles[];
  /** Every other file of the bundle, in its order. */
  readonly files: readonly BundleFile[];
}

/** A figure as the manifest gives it. */
interface ManifestMeasure {
  readonly value: number;
  readonly unit: LengthUnit | 'degrees' | 'count' | 'CIEDE2000';
}

interface ManifestPiece {
  readonly files: readonly string[];
  readonly wood: string;
  readonly edges: TileEdges;
  readonly mirrored: boolean;
  readonly count: number;
  readonly spares: number;
  /** Said when a centre path was asked for. */
  readonly centrePath?: CentrePathOutcome;
  readonly tiles: readonly string[];
  /** Those of the tiles that lie face down; left out when none does. */
  readonly faceDown?: readonly string[];
}

/** manifest.json as it is written. */
export interface Manifest {
  readonly format: typeof BUNDLE_FORMAT;
  readonly formatVersion: typeof BUNDLE_FORMAT_VERSION;
  readonly program: typeof PROGRAM;
  readonly layout: Pick<Layout['shell'], 'staves' | 'courses'> & {
    readonly name: string;
    readonly scheme: Layout['joint']['scheme'];
    readonly way: Layout['build']['way'];
  };
  readonly version: BundleVersion | null;
  readonly unit: LengthUnit;
  readonly clearance: number;
  readonly cutter: Layout['cutter'];
  readonly checks: readonly {
    readonly key: CheckKey;
    readonly result: CheckOutcome;
    readonly figure: ManifestMeasure | null;
    readonly limit: ManifestMeasure | null;
  }[];
  readonly override: (Override & { readonly stops: readonly CheckKey[] }) | null;
  readonly files: readonly { readonly path: string; readonly sha256: string }[];
  readonly pieces: readonly ManifestPiece[];
}

/** The manifest of a bundle. */
export function manifestOf(contents: ManifestContents): Manifest {
  const { layout, unit, checks, override } = contents;
  const { staves, courses } = layout.shell;
  return {
    format: BUNDLE_FORMAT,
    formatVersion: BUNDLE_FORMAT_VERSION,
    program: PROGRAM,
    layout: {
      name: layout.name,
      staves,
      courses,
      scheme: layout.joint.scheme,
      way: layout.build.way,
    },
    version: contents.version,
    unit,
    clearance: lengthIn(layout.joint.clearance, unit),
    cutter: {
      diameter: lengthIn(layout.cutter.diameter, unit),
      fluteLength: lengthIn(layout.cutter.fluteLength, unit),
    },
    checks: checks.map(({ key, result, figure, limit }) => ({
      key,
      result,
      figure: measureIn(figure, unit),
      limit: measureIn(limit, unit),
    })),
    override: override && { ...override, stops: stopsOf(checks) },
    files: contents.files.map(({ path, text }) => ({ path, sha256: sha256Of(text) })),
    pieces: contents.pieces.map((piece) => pieceOf(layout, piece)),
  };
}

/** The manifest as the text of its file. */
export function printManifest(manifest: Manifest): string {
  return `${JSON.stringify(manifest, null, 2)}\n`;
}

function pieceOf(layout: Layout, { kind, files, centrePath }: PieceFiles): ManifestPiece {
  const namesOf = (positions: readonly number[]) =>
    positions.map((position) => {
      const { stave, course } = tileOf(layout.shell, position);
      return tileName(stave, course);
    });
  return {
    files: files.map((file) => file.path),
    wood: layout.woods[kind.wood]?.key ?? '',
    edges: kind.edges,
    mirrored: kind.mirrored,
    count: kind.count,
    spares: kind.spares,
    ...(centrePath === null ? {} : { centrePath }),
    tiles: namesOf(kind.positions),
    ...(kind.faceDown.length === 0 ? {} : { faceDown: namesOf(kind.faceDown) }),
  };
}

function stopsOf(checks: readonly CheckResult[]): CheckKey[] {
  return checks.filter((check) => check.result === 'stop').map((check) => check.key);
}

/** Figures are rounded to a millionth, so that the last bit of a sine never changes the bytes. */
function lengthIn(length: Millimetres, unit: LengthUnit): number {
  return Number(fromMillimetres(length, unit).toFixed(6));
}

const MEASURE_UNITS = {
  angle: 'degrees',
  count: 'count',
  'colour-difference': 'CIEDE2000',
} as const;

function measureIn(measure: Measure | null, unit: LengthUnit): ManifestMeasure | null {
  if (measure === null) return null;
  if (measure.kind === 'length') return { value: lengthIn(measure.value, unit), unit };
  return { value: Number(measure.value.toFixed(6)), unit: MEASURE_UNITS[measure.kind] };
}

function sha256Of(text: string): string {
  return bytesToHex(sha256(utf8ToBytes(text)));
}
