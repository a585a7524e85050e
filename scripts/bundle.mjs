/**
 * `npm run bundle -- LAYOUT.json OUTDIR …`: paths are those of the folder it was called from, and the exit
 * code is the writer's own.
 */
import { runChild } from './children.mjs';
import { runProgram } from './ending.mjs';
import { installAll } from './set-up.mjs';
import { nodeParameters, typescriptEnvironment } from './typescript.mjs';

await runProgram(async () => {
  await installAll([]);
  const parameters = nodeParameters('exports/command-line.ts', process.argv.slice(2));
  const { code } = await runChild(process.execPath, parameters, {
    folder: process.env['INIT_CWD'] ?? process.cwd(),
    environment: typescriptEnvironment,
  });
  return code;
});
