/** `npm run bench [-- NAME …]`: the benches of tests/bench whose file names hold a NAME, as one table. */
import { runChild } from './children.mjs';
import { runProgram } from './ending.mjs';
import { testTools } from './debian-packages.mjs';
import { installAll } from './set-up.mjs';
import { nodeParameters, typescriptEnvironment } from './typescript.mjs';

await runProgram(async () => {
  await installAll(testTools);
  const parameters = nodeParameters('tests/bench/run.ts', process.argv.slice(2));
  // Peak memory is measured between collections the bench asks for.
  const { code } = await runChild(process.execPath, ['--expose-gc', ...parameters], {
    environment: typescriptEnvironment,
  });
  return code;
});
