/**
 * A reason to stop that the reader can do something about. The entry programs print its sentence and
 * end with exit code 1; anything else is a fault of ours and is printed with its stack.
 */
export class Refusal extends Error {}

/**
 * Runs an entry program and turns a refusal into a sentence.
 * @param {() => Promise<number>} program returns the exit code
 */
export async function runProgram(program) {
  try {
    process.exitCode = await program();
  } catch (error) {
    process.exitCode = 1;
    console.error(error instanceof Refusal ? `\n${error.message}` : error);
  }
}
