import { inject } from 'vitest';

/**
 * The server reads its configuration when it is imported, so the addresses are set before any test file is.
 * DATABASE_URL is left to each test: it makes a database of its own with `freshDatabase()`.
 */
const storage = inject('storage');
Object.assign(process.env, {
  S3_ENDPOINT: storage.endpoint,
  S3_BUCKET: storage.bucket,
  S3_REGION: storage.region,
  S3_ACCESS_KEY: storage.accessKey,
  S3_SECRET_KEY: storage.secretKey,
  SMTP_URL: inject('mail').url,
});
