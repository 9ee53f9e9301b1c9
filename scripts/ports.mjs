import { connect, createServer } from 'node:net';

/**
 * Whether a server of ours could listen there.
 * @param {number} port
 * @param {string} host
 * @returns {Promise<boolean>}
 */
export const isPortFree = (port, host = '127.0.0.1') =>
  new Promise((resolve) => {
    const server = createServer();
    server.once('error', () => resolve(false));
    server.listen({ port, host, exclusive: true }, () => server.close(() => resolve(true)));
  });

/** A port on 127.0.0.1 that was free a moment ago. @returns {Promise<number>} */
export const findFreePort = () =>
  new Promise((resolve, reject) => {
    const server = createServer();
    server.once('error', reject);
    server.listen(0, '127.0.0.1', () => {
      const address = server.address();
      const port = typeof address === 'object' && address ? address.port : 0;
      server.close(() => resolve(port));
    });
  });

/** Whether something answers on that port within a second. @param {number} port @returns {Promise<boolean>} */
export const isAnswering = (port) =>
  new Promise((resolve) => {
    const socket = connect({ port, host: '127.0.0.1' });
    const end = (/** @type {boolean} */ answer) => {
      socket.destroy();
      resolve(answer);
    };
    socket.setTimeout(1000, () => end(false));
    socket.once('connect', () => end(true));
    socket.once('error', () => end(false));
  });
