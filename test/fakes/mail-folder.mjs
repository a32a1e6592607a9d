import { mkdirSync, readdirSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { setTimeout as delay } from 'node:timers/promises';
import { simpleParser } from 'mailparser';

/**
 * One message as it arrived.
 *
 * @typedef {object} Message
 * @property {string} from
 * @property {string[]} to the envelope's recipients, so blind copies are among them
 * @property {string} subject
 * @property {string} text
 * @property {string} html empty where the message has none
 * @property {string} raw everything that was sent
 */

/**
 * @param {string} raw
 * @returns {Promise<Message>}
 */
async function readMessage(raw) {
  const parsed = await simpleParser(raw);
  const envelope = parsed.headers.get('x-envelope-to');
  return {
    from: parsed.from?.value[0]?.address ?? '',
    to: typeof envelope === 'string' ? envelope.split(', ') : [],
    subject: parsed.subject ?? '',
    text: parsed.text ?? '',
    html: parsed.html || '',
    raw,
  };
}

/**
 * A folder of messages, oldest first, one .eml file each; several processes may look into it.
 *
 * @param {string} directory made where it is missing
 */
export function openMailFolder(directory) {
  mkdirSync(directory, { recursive: true, mode: 0o700 });
  let count = 0;

  const files = () =>
    readdirSync(directory)
      .filter((name) => name.endsWith('.eml'))
      .sort()
      .map((name) => path.join(directory, name));

  const messages = () => Promise.all(files().map((file) => readMessage(readFileSync(file, 'utf8'))));

  return {
    /**
     * @param {Buffer} content
     * @param {string[]} recipients
     */
    keep(content, recipients) {
      const order = `${Date.now()}-${String((count += 1)).padStart(6, '0')}`;
      const file = path.join(directory, `${order}-${process.pid}.eml`);
      const header = `X-Envelope-To: ${recipients.join(', ')}\r\n`;
      // Renamed when whole, so that nobody reads half a message.
      writeFileSync(`${file}.part`, Buffer.concat([Buffer.from(header), content]), { mode: 0o600 });
      renameSync(`${file}.part`, file);
    },

    messages,

    /**
     * Waits for a message.
     *
     * @param {(message: Message) => boolean} predicate
     * @param {number} [timeoutMs]
     * @returns {Promise<Message>} the newest one that fits
     * @throws {Error} naming the subjects that did arrive
     */
    async waitFor(predicate, timeoutMs = 10_000) {
      const deadline = Date.now() + timeoutMs;
      for (;;) {
        const all = await messages();
        const found = all.findLast(predicate);
        if (found !== undefined) return found;
        if (Date.now() > deadline) {
          const arrived = all.map(({ to, subject }) => `${to.join(', ')}: ${subject}`).join('; ');
          throw new Error(`No such message within ${timeoutMs} ms. Arrived: ${arrived || 'nothing'}.`);
        }
        await delay(50);
      }
    },

    clear() {
      for (const file of files()) rmSync(file, { force: true });
    },
  };
}
