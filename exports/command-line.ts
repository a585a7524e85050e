/**
 * `npm run bundle`: the bundle of a layout file as a folder, without server or database. The folder is
 * written under another name beside its place and then renamed, so nobody ever sees half of it.
 */
import { randomUUID } from 'node:crypto';
import { mkdir, open, readdir, readFile, rename, rm, writeFile } from 'node:fs/promises';
import { dirname, join, resolve } from 'node:path';
import { pathToFileURL } from 'node:url';
import { parseArgs } from 'node:util';
import * as z from 'zod';
import { bundleRequestSchema } from '@shared/api/bundle';
import { readLayoutText } from '@shared/layout/read-layout';
import { BOUNDS, lineOfText, type Layout } from '@shared/layout/schema';
import { buildBundle, type BundleOptions } from './bundle';
import { checkLine } from './check-report';
import { BUNDLE_FORMAT } from './manifest';
import type { BundleFile } from './zip/zip-files';

const HELP = `Writes the bundle of a layout file: outlines, map, cut list and manifest.

  npm run bundle -- LAYOUT.json OUTDIR [options]

  --dxf r12|r2000      release of the DXF files (r2000)
  --unit mm|in         unit of the DXF files, the cut list and the manifest (mm)
  --centre-path        draw the cutter's centre line too, on its own layer
  --override "reason"  go on in spite of a stop; the manifest says so
  --by "name"          who overrides (the command line)
  --help               this text

OUTDIR is made. One that exists must be empty or hold a bundle and nothing else; that bundle is replaced.
Exit code 0: written. 1: a check says stop, nothing is written. 2: a bad file or argument, named.
`;

/** No layout file is larger; a wrong file of many megabytes is refused without reading it. */
const FILE_BYTES_MOST = 1024 * 1024;

/** Where the lines go. */
export interface Printer {
  readonly log: (line: string) => void;
  readonly error: (line: string) => void;
}

/** Something the caller has to mend, with the argument or field it is about. */
class Refusal extends Error {}

/** Runs the command and returns its exit code; prints one line a check. */
export async function runBundleCommand(args: readonly string[], printer: Printer): Promise<number> {
  try {
    const command = readArguments(args);
    if (command === 'help') {
      printer.log(HELP);
      return 0;
    }
    const layout = await readLayoutFile(command.layoutPath);
    const place = resolve(command.outPath);
    await refuseForeignFolder(place, command.outPath);
    const result = buildBundle(layout, command.options);
    const checks = result.ok ? result.bundle.checks : result.checks;
    for (const check of checks) printer.log(checkLine(check));
    if (!result.ok) {
      printer.error('Stopped: nothing is written. Mend what the stops say, or give --override.');
      return 1;
    }
    await writeFolder(place, result.bundle.files);
    printer.log(`Written: ${result.bundle.files.length} files in ${command.outPath}`);
    return 0;
  } catch (error) {
    if (!(error instanceof Refusal)) throw error;
    printer.error(error.message);
    return 2;
  }
}

interface Command {
  readonly layoutPath: string;
  readonly outPath: string;
  readonly options: BundleOptions;
}

function readArguments(args: readonly string[]): Command | 'help' {
  const { values, positionals } = parsed(args);
  if (values.help === true) return 'help';
  const [layoutPath, outPath, stray] = positionals;
  if (layoutPath === undefined) throw new Refusal('LAYOUT.json: is missing. Try --help.');
  if (outPath === undefined) throw new Refusal('OUTDIR: is missing. Try --help.');
  if (stray !== undefined) throw new Refusal(`${stray}: is one argument too many. Try --help.`);
  const request = bundleRequestSchema.safeParse({
    dxf: values.dxf,
    unit: values.unit,
    centrePath: values['centre-path'],
    override: values.override === undefined ? undefined : { reason: values.override },
  });
  if (!request.success) throw new Refusal(request.error.issues.map(argumentProblem).join('\n'));
  const { dxf, unit, centrePath, override } = request.data;
  const by = lineOfText(BOUNDS.nameLength.most).safeParse(values.by ?? 'command line');
  if (!by.success) throw new Refusal(`--by: ${by.error.issues[0]?.message ?? 'must be a name'}`);
  return {
    layoutPath,
    outPath,
    options: {
      ...{ dxf, unit, centrePath, version: null },
      ...(override ? { override: { who: by.data, reason: override.reason } } : {}),
    },
  };
}

function parsed(args: readonly string[]) {
  try {
    return parseArgs({
      args: [...args],
      allowPositionals: true,
      options: {
        dxf: { type: 'string' },
        unit: { type: 'string' },
        'centre-path': { type: 'boolean' },
        override: { type: 'string' },
        by: { type: 'string' },
        help: { type: 'boolean' },
      },
    });
  } catch (error) {
    throw new Refusal(error instanceof Error ? error.message : String(error));
  }
}

function argumentProblem(issue: z.core.$ZodIssue): string {
  return `--${String(issue.path[0])}: ${issue.message}`;
}

async function readLayoutFile(path: string): Promise<Layout> {
  const reading = readLayoutText(await readText(path));
  if (reading.ok) return reading.layout;
  throw new Refusal(
    reading.problems.map(({ field, message }) => `${path}: ${field} ${message}`).join('\n'),
  );
}

async function readText(path: string): Promise<string> {
  const file = await open(path).catch((error: unknown) => {
    throw new Refusal(`${path}: cannot be opened (${codeOf(error)})`);
  });
  try {
    const stat = await file.stat();
    if (!stat.isFile()) throw new Refusal(`${path}: is not a file`);
    if (stat.size > FILE_BYTES_MOST) {
      throw new Refusal(`${path}: is larger than 1 MiB, so it is not a layout file`);
    }
    return new TextDecoder('utf-8', { fatal: true }).decode(await file.readFile());
  } catch (error) {
    if (error instanceof TypeError) throw new Refusal(`${path}: is not UTF-8 text`);
    throw error;
  } finally {
    await file.close();
  }
}

/** Only what is ours may be replaced: a folder that holds the files its manifest lists and no other. */
async function refuseForeignFolder(place: string, name: string): Promise<void> {
  const found = await filesIn(place, name);
  if (found.length === 0) return;
  const own = await filesOfManifest(place);
  const foreign = found.find((path) => !own.has(path));
  if (foreign === undefined) return;
  throw new Refusal(
    `OUTDIR ${name}: holds ${foreign}, which is not of a bundle. Name a new folder.`,
  );
}

async function filesIn(place: string, name: string): Promise<string[]> {
  try {
    const entries = await readdir(place, { recursive: true, withFileTypes: true });
    return entries
      .filter((entry) => !entry.isDirectory())
      .map((entry) => join(entry.parentPath, entry.name).slice(place.length + 1));
  } catch (error) {
    if (codeOf(error) === 'ENOENT') return [];
    throw new Refusal(`OUTDIR ${name}: is not a folder that can be read (${codeOf(error)})`);
  }
}

const writtenManifestSchema = z.object({
  format: z.literal(BUNDLE_FORMAT),
  files: z.array(z.object({ path: z.string() })),
});

async function filesOfManifest(place: string): Promise<Set<string>> {
  try {
    const text = await readFile(join(place, 'manifest.json'), 'utf8');
    const { files } = writtenManifestSchema.parse(JSON.parse(text));
    return new Set(['manifest.json', ...files.map((file) => join(file.path))]);
  } catch {
    return new Set();
  }
}

async function writeFolder(place: string, files: readonly BundleFile[]): Promise<void> {
  const mark = randomUUID();
  const fresh = `${place}.${mark}.new`;
  const old = `${place}.${mark}.old`;
  try {
    for (const { path, text } of files) {
      const target = join(fresh, path);
      await mkdir(dirname(target), { recursive: true });
      await writeFile(target, text);
    }
    const replaced = await moved(place, old);
    await rename(fresh, place).catch(async (error: unknown) => {
      if (replaced) await rename(old, place);
      throw error;
    });
    await rm(old, { recursive: true, force: true });
  } catch (error) {
    throw new Refusal(`OUTDIR ${place}: cannot be written (${codeOf(error)})`);
  } finally {
    await rm(fresh, { recursive: true, force: true });
  }
}

/** Whether there was something to move. */
async function moved(from: string, to: string): Promise<boolean> {
  try {
    await rename(from, to);
    return true;
  } catch (error) {
    if (codeOf(error) === 'ENOENT') return false;
    throw error;
  }
}

function codeOf(error: unknown): string {
  return error instanceof Error && 'code' in error ? String(error.code) : String(error);
}

if (process.argv[1] !== undefined && import.meta.url === pathToFileURL(process.argv[1]).href) {
  process.exitCode = await runBundleCommand(process.argv.slice(2), console);
}
