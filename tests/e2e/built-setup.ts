import { buildAll } from '../../scripts/set-up.mjs';

/** Global set-up of the browser specs: what they open is the built program, of today's sources. */
export default function setup(): Promise<void> {
  return buildAll();
}
