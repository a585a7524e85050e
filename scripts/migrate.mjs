/** `npm run migrate`: brings DATABASE_URL, or the copy's own database, to the newest tables. */
import { migrate, useDatabase } from './database.mjs';
import { runProgram } from './ending.mjs';
import { installAll } from './set-up.mjs';

await runProgram(async () => {
  await installAll([]);
  await migrate(await useDatabase());
  return 0;
});
