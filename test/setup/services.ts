import { chmodSync, mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { startStorageFake } from '@weighhouse/storage-fake';
import type { TestProject } from 'vitest/node';
import { startMariaDb } from '../../db/launch/mariadb.mjs';
import { createProcesses } from '../../db/launch/processes.mjs';
import { randomText } from '../../db/launch/secrets.mjs';
import { startMailFake } from '../fakes/mail-fake.mjs';
import { databasePrefix } from './database-prefix.js';

const bucket = 'weighhouse-test';

declare module 'vitest' {
  export interface ProvidedContext {
    /** mysql://… of an account that may make databases named `weighhouse_test_…` */
    databaseUrl: string;
    /** S3 on loopback; the bucket exists */
    storage: { endpoint: string; bucket: string; region: string; accessKey: string; secretKey: string };
    /** the address to send to, and the folder where what arrived is kept */
    mail: { url: string; directory: string };
  }
}

/**
 * Starts a MariaDB of its own in a throw-away folder, the storage fake and the mail fake, once for all test
 * files, and tells the tests where they are.
 */
export default async function startServices(project: TestProject): Promise<() => Promise<void>> {
  const directory = mkdtempSync(path.join(tmpdir(), 'weighhouse-test-'));
  // The database runs as a user of its own, who has to pass through here.
  chmodSync(directory, 0o711);
  const processes = createProcesses();
  const stops: (() => Promise<void>)[] = [() => processes.stopAll()];
  const stop = async (): Promise<void> => {
    for (const stopOne of stops.reverse()) await stopOne();
    rmSync(directory, { recursive: true, force: true });
  };
  try {
    const { url } = await startMariaDb({
      directory: path.join(directory, 'mariadb'),
      password: randomText(),
      processes,
      grants: [`${databasePrefix.replaceAll('_', '\\_')}%`],
      // Nothing here outlives the run, so nothing waits for the disk.
      extra: ['--innodb-flush-log-at-trx-commit=0', '--innodb-doublewrite=0', '--skip-innodb-use-native-aio'],
    });
    const accessKey = randomText();
    const secretKey = randomText();
    const storage = await startStorageFake({
      directory: path.join(directory, 'storage'),
      bucket,
      accessKey,
      secretKey,
    });
    stops.push(() => storage.stop());
    const mailDirectory = path.join(directory, 'mail');
    const mail = await startMailFake({ directory: mailDirectory });
    stops.push(() => mail.stop());
    project.provide('databaseUrl', url);
    project.provide('storage', {
      endpoint: storage.endpoint,
      bucket,
      region: 'eu-central-1',
      accessKey,
      secretKey,
    });
    project.provide('mail', { url: mail.url, directory: mailDirectory });
  } catch (error) {
    await stop();
    throw error;
  }
  return stop;
}
