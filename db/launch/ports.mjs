import { connect, createServer } from 'node:net';
import { LaunchFault } from './fault.mjs';

const loopback = '127.0.0.1';

/**
 * @param {number} port 0 asks the system for a free one
 * @param {string} host
 * @returns {Promise<number>} the port that could be opened; it is closed again
 */
function tryPort(port, host) {
  return new Promise((resolve, reject) => {
    const server = createServer();
    server.once('error', reject);
    server.listen({ port, host, exclusive: true }, () => {
      const address = server.address();
      server.close(() => resolve(address !== null && typeof address === 'object' ? address.port : port));
    });
  });
}

/** A port on loopback that nothing listens on at the moment. */
export function freePort() {
  return tryPort(0, loopback);
}

/**
 * @param {{ host: string, port: number }} address
 * @throws {LaunchFault} naming the variable to set
 */
export async function requireFreePort({ host, port }) {
  try {
    await tryPort(port, host);
  } catch (error) {
    const code = /** @type {NodeJS.ErrnoException} */ (error).code;
    if (code === 'EADDRINUSE') {
      throw new LaunchFault(
        `Port ${port} on ${host} is taken by another program. Choose another with the variable PORT, for instance\n  PORT=${port === 65535 ? port - 1 : port + 1} npm start`,
      );
    }
    if (code === 'EACCES') {
      throw new LaunchFault(`Port ${port} is not open to this user. Set PORT to a number above 1023.`);
    }
    if (code === 'EADDRNOTAVAIL' || code === 'ENOTFOUND') {
      throw new LaunchFault(
        `This machine has no address ${host}. Set HOST to one of its own, or leave it out.`,
      );
    }
    throw error;
  }
}

/**
 * Whether something accepts connections there.
 *
 * @param {number} port
 * @param {(firstBytes: Buffer) => boolean} [greeting] when given, the other side must speak first and this must hold
 * @returns {Promise<boolean>}
 */
export function answers(port, greeting) {
  return new Promise((resolve) => {
    const socket = connect({ port, host: loopback });
    /** @param {boolean} result */
    const finish = (result) => {
      socket.destroy();
      resolve(result);
    };
    socket.setTimeout(2_000, () => finish(false));
    socket.once('error', () => finish(false));
    socket.once('close', () => resolve(false));
    if (greeting === undefined) socket.once('connect', () => finish(true));
    else socket.once('data', (bytes) => finish(greeting(bytes)));
  });
}
