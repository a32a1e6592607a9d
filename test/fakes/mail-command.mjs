import { parseArgs } from 'node:util';
import { startMailFake } from './mail-fake.mjs';

/** node mail-command.mjs --port 2525 --directory … */
const { values } = parseArgs({ options: { port: { type: 'string' }, directory: { type: 'string' } } });
const { port, directory } = values;
if (!port || !directory) throw new Error('The mail server needs --port and --directory.');
const { url, stop } = await startMailFake({ port: Number(port), directory });
console.log(`Mail at ${url}`);
process.once('SIGTERM', () => void stop());
