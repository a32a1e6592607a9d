import { parseArgs } from 'node:util';
import { startStorageFake } from './storage-fake.mjs';

/** node command.mjs --port 4568 --directory … --bucket …, with the keys in STORAGE_ACCESS_KEY and STORAGE_SECRET_KEY */
const { values } = parseArgs({
  options: { port: { type: 'string' }, directory: { type: 'string' }, bucket: { type: 'string' } },
});
const { STORAGE_ACCESS_KEY: accessKey, STORAGE_SECRET_KEY: secretKey } = process.env;
const { port, directory, bucket } = values;
if (!port || !directory || !bucket || !accessKey || !secretKey) {
  throw new Error(
    'The storage needs --port, --directory, --bucket, STORAGE_ACCESS_KEY and STORAGE_SECRET_KEY.',
  );
}
const { endpoint, stop } = await startStorageFake({
  port: Number(port),
  directory,
  bucket,
  accessKey,
  secretKey,
});
console.log(`Storage at ${endpoint}`);
process.once('SIGTERM', () => void stop());
