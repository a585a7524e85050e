/**
 * A reason to stop that the reader can do something about: the entry programs print its sentence and end
 * with exit code 1. Anything else thrown is a fault of ours and is printed with its stack.
 */
export class Refusal extends Error {}
