import { randomBytes } from 'node:crypto';
import { createConnection } from 'mysql2/promise';
import { inject } from 'vitest';
import { databasePrefix } from './database-prefix.js';

export interface FreshDatabase {
  /** mysql://… of an empty database that nobody else uses */
  url: string;
  name: string;
  /** Removes it with everything in it. */
  drop: () => Promise<void>;
}

async function run(statement: string): Promise<void> {
  const connection = await createConnection(inject('databaseUrl'));
  try {
    await connection.query(statement);
  } finally {
    await connection.end();
  }
}

/** Makes an empty database on the tests' MariaDB. */
export async function freshDatabase(): Promise<FreshDatabase> {
  const name = `${databasePrefix}${randomBytes(8).toString('hex')}`;
  await run(`CREATE DATABASE \`${name}\` CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci`);
  const url = new URL(inject('databaseUrl'));
  url.pathname = `/${name}`;
  return { url: url.href, name, drop: () => run(`DROP DATABASE IF EXISTS \`${name}\``) };
}
