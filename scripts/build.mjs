/** `npm run build`: the app into dist/app, the server into dist/server. */
import { runProgram } from './ending.mjs';
import { buildAll, installAll } from './set-up.mjs';

await runProgram(async () => {
  await installAll([]);
  await buildAll();
  return 0;
});
