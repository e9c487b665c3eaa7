import { createServer } from 'node:net';

/**
 * Whether a server could listen on this port now.
 * @param {number} port
 * @param {string} [host] every address when left out
 * @returns {Promise<boolean>}
 */
export function isPortFree(port, host) {
  return new Promise((resolve) => {
    const probe = createServer();
    probe.once('error', () => resolve(false));
    probe.listen({ port, host }, () => probe.close(() => resolve(true)));
  });
}

/**
 * A port on the loopback address that nothing listens on.
 * @returns {Promise<number>}
 */
export function freePort() {
  return new Promise((resolve, reject) => {
    const probe = createServer();
    probe.once('error', reject);
    probe.listen(0, '127.0.0.1', () => {
      const address = probe.address();
      const port = typeof address === 'object' && address ? address.port : 0;
      probe.close(() => resolve(port));
    });
  });
}
