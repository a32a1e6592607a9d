import { mkdirSync } from 'node:fs';
import S3rver from 's3rver';
import account from 's3rver/lib/models/account.js';

/**
 * A small S3 on loopback that keeps its objects as files. s3rver does not check signatures, so the access
 * key works like a password: without it nothing is answered. It is dependable for put, get with a range that
 * names start and end, head, delete and multipart uploads; use nothing else of S3 with it.
 *
 * @param {object} options
 * @param {number} [options.port] a free one where left out
 * @param {string} options.directory made where it is missing
 * @param {string} options.bucket made where it is missing
 * @param {string} [options.accessKey]
 * @param {string} [options.secretKey]
 * @returns {Promise<{ endpoint: string, stop: () => Promise<void> }>}
 */
export async function startStorageFake({
  port = 0,
  directory,
  bucket,
  accessKey = 'S3RVER',
  secretKey = 'S3RVER',
}) {
  mkdirSync(directory, { recursive: true, mode: 0o700 });
  account.DUMMY_ACCOUNT.createKeyPair(accessKey, secretKey);
  const fake = new S3rver({
    address: '127.0.0.1',
    port,
    directory,
    silent: true,
    vhostBuckets: false,
    configureBuckets: [{ name: bucket }],
  });
  fake.middleware.unshift(async (context, next) => {
    if (context.headers['authorization']?.includes(`Credential=${accessKey}/`)) await next();
    else context.status = 403;
  });
  const address = await fake.run();
  return {
    endpoint: `http://127.0.0.1:${address.port}`,
    async stop() {
      const closed = fake.close();
      fake.httpServer.closeAllConnections();
      await closed;
    },
  };
}
