import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { SMTPServer } from 'smtp-server';
import { openMailFolder } from './mail-folder.mjs';

const largestMessage = 10_000_000;

/**
 * An SMTP server on loopback that delivers nothing and keeps everything, for the demo and for tests.
 *
 * @param {object} [options]
 * @param {number} [options.port] a free one where left out
 * @param {string} [options.directory] where the messages are kept; left out, a folder that `stop` removes
 */
export async function startMailFake({ port = 0, directory } = {}) {
  const kept = directory ?? mkdtempSync(path.join(tmpdir(), 'mail-'));
  const { keep, messages, waitFor, clear } = openMailFolder(kept);
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ['AUTH', 'STARTTLS'],
    disableReverseLookup: true,
    size: largestMessage,
    onData(stream, session, done) {
      /** @type {Buffer[]} */
      const parts = [];
      stream.on('data', (part) => parts.push(part));
      stream.on('end', () => {
        if (stream.sizeExceeded) {
          done(Object.assign(new Error('The message is too large'), { responseCode: 552 }));
          return;
        }
        keep(
          Buffer.concat(parts),
          session.envelope.rcptTo.map(({ address }) => address),
        );
        done();
      });
    },
  });
  // A sender that hangs up must not end the server.
  server.on('error', () => undefined);
  const address = await new Promise((resolve, reject) => {
    server.server.once('error', reject);
    server.listen(port, '127.0.0.1', () => resolve(server.server.address()));
  });
  return {
    url: `smtp://127.0.0.1:${address.port}`,
    messages,
    waitFor,
    clear,
    /** @returns {Promise<void>} */
    async stop() {
      await new Promise((resolve) => {
        server.close(() => resolve(undefined));
      });
      if (directory === undefined) rmSync(kept, { recursive: true, force: true });
    },
  };
}
