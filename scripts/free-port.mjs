import { createServer } from 'node:net';

/**
 * Whether nothing listens on the port of the loopback address.
 * @param {number} port 0 asks the system for any free one
 * @returns {Promise<number | null>} the port, or null when it is taken
 */
function tryPort(port) {
  return new Promise((resolve) => {
    const probe = createServer();
    probe.once('error', () => resolve(null));
    probe.listen(port, '127.0.0.1', () => {
      const address = probe.address();
      const found = typeof address === 'object' && address !== null ? address.port : null;
      probe.close(() => resolve(found));
    });
  });
}

/** A port of the loopback address that nothing listens on. */
export async function freePort() {
  const port = await tryPort(0);
  if (port === null) throw new Error('The system gave no free port on 127.0.0.1.');
  return port;
}

/**
 * The first free port from the wished one upwards, or any free one when the next 50 are all taken.
 * @param {number} wished
 */
export async function freePortFrom(wished) {
  for (let port = wished; port < Math.min(wished + 50, 65_536); port += 1) {
    if ((await tryPort(port)) !== null) return port;
  }
  return freePort();
}
