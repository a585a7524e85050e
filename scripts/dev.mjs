/**
 * `npm run dev`: the server started anew at every change, and the app from Angular's development server,
 * which hands /api on to it.
 */
import { mkdirSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { startChild } from './children.mjs';
import { migrate, seed, useDatabase } from './database.mjs';
import { runProgram } from './ending.mjs';
import { freePort, freePortFrom } from './free-port.mjs';
import { runFolder } from './project.mjs';
import { sessionSecret } from './session-secret.mjs';
import { installAll } from './set-up.mjs';
import { nodeParameters } from './typescript.mjs';

/** @param {number} apiPort */
function writeProxy(apiPort) {
  const path = join(runFolder, 'dev-proxy.json');
  mkdirSync(runFolder, { recursive: true });
  writeFileSync(path, JSON.stringify({ '/api': { target: `http://127.0.0.1:${apiPort}` } }));
  return path;
}

await runProgram(
  async () => {
    await installAll([]);
    const databaseUrl = await useDatabase();
    await migrate(databaseUrl);
    await seed(databaseUrl);
    const apiPort = await freePort();
    const appPort = await freePortFrom(Number(process.env['PORT'] ?? 4200));
    startChild(process.execPath, ['--watch', ...nodeParameters('server/main.ts')], {
      environment: {
        NODE_ENV: 'development',
        PORT: String(apiPort),
        DATABASE_URL: databaseUrl,
        SESSION_SECRET: sessionSecret(),
      },
    });
    const app = startChild(
      process.execPath,
      [
        ...['node_modules/@angular/cli/bin/ng.js', 'serve', '--host=127.0.0.1'],
        ...[`--port=${appPort}`, `--proxy-config=${writeProxy(apiPort)}`],
      ],
      { environment: { NG_CLI_ANALYTICS: 'false' } },
    );
    return new Promise((resolve) => app.once('exit', (code) => resolve(code ?? 1)));
  },
  { exitCodeOnSignal: 0 },
);
