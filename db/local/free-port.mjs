import { createServer } from 'node:net';

/**
 * @param {number} port
 * @param {string} [host]
 * @returns {Promise<'free' | 'taken' | 'forbidden' | 'no-address'>}
 */
export function portState(port, host = '127.0.0.1') {
  return new Promise((resolve) => {
    const probe = createServer();
    probe.once('error', (error) => {
      if (error.code === 'EACCES') resolve('forbidden');
      else if (error.code === 'EADDRNOTAVAIL' || error.code === 'ENOTFOUND') resolve('no-address');
      else resolve('taken');
    });
    probe.listen({ port, host, exclusive: true }, () => probe.close(() => resolve('free')));
  });
}

/**
 * A port of the loopback address that nothing listens on now.
 * @returns {Promise<number>}
 */
export function anyFreePort() {
  return new Promise((resolve, reject) => {
    const probe = createServer();
    probe.once('error', reject);
    probe.listen({ port: 0, host: '127.0.0.1' }, () => {
      const { port } = probe.address();
      probe.close(() => resolve(port));
    });
  });
}
