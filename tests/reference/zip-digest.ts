/** Prints the SHA-256 of the ZIP of a layout file's bundle; run by itself under other zones and languages. */
import { createHash } from 'node:crypto';
import { readFileSync } from 'node:fs';
import { buildBundle, bundleZip } from '@exports/bundle';
import { readLayoutText } from '@shared/layout/read-layout';

const reading = readLayoutText(readFileSync(process.argv[2] ?? '', 'utf8'));
if (!reading.ok) throw new Error('the fixture cannot be read');
const result = buildBundle(reading.layout, {
  ...{ dxf: 'r2000', unit: 'in', centrePath: true, version: null },
});
if (!result.ok) throw new Error('the fixture is stopped');
process.stdout.write(createHash('sha256').update(bundleZip(result.bundle)).digest('hex'));
