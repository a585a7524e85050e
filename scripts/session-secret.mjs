import { randomBytes } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { runFolder } from './project.mjs';

/**
 * SESSION_SECRET, or one made once for this copy and kept where only its owner reads it, so that people
 * stay signed in when the server is started again.
 */
export function sessionSecret() {
  const given = process.env['SESSION_SECRET'];
  if (given !== undefined && given !== '') return given;
  const path = join(runFolder, 'session-secret');
  if (!existsSync(path)) {
    mkdirSync(runFolder, { recursive: true });
    writeFileSync(path, randomBytes(32).toString('hex'), { mode: 0o600 });
  }
  return readFileSync(path, 'utf8').trim();
}
