/** `npm run seed`: adds the demonstration to DATABASE_URL or the copy's own database. */
import { migrate, seed, useDatabase } from './database.mjs';
import { runProgram } from './ending.mjs';
import { installAll } from './set-up.mjs';

await runProgram(async () => {
  await installAll([]);
  const databaseUrl = await useDatabase();
  await migrate(databaseUrl);
  await seed(databaseUrl);
  return 0;
});
