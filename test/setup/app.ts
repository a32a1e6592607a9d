import { randomBytes } from 'node:crypto';
import type { AddressInfo } from 'node:net';
import type { INestApplicationContext } from '@nestjs/common';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { NestFactory } from '@nestjs/core';
import { makeDataSource } from '@weighhouse/db/data-source';
import { AppModule } from '@weighhouse/server/app.module';
import { Clock } from '@weighhouse/server/platform/clock/clock';
import { configureApplication } from '@weighhouse/server/platform/http/application';
import { Outbox } from '@weighhouse/server/platform/mail/outbox';
import supertest from 'supertest';
import { DataSource } from 'typeorm';
import { freshDatabase } from './fresh-database.js';

export interface RunningApp {
  app: NestExpressApplication;
  /** http://127.0.0.1:port of the running application. */
  url: string;
  databaseUrl: string;
  /** A browser of its own: keeps its cookies. */
  agent(): ReturnType<typeof supertest.agent>;
  source: DataSource;
  clock: Clock;
  outbox: Outbox;
  close(): Promise<void>;
}

/**
 * The whole application on a fresh, migrated database and a free port of loopback.
 * Storage and mail are the fakes that the global setup started (S3_ENDPOINT, SMTP_URL).
 */
export async function startApp(environment: Record<string, string> = {}): Promise<RunningApp> {
  const database = await freshDatabase();
  await prepareSchema(database.url);
  Object.assign(process.env, {
    DATABASE_URL: database.url,
    SESSION_SECRET: randomBytes(32).toString('hex'),
    IDENTITY_KEY: randomBytes(32).toString('hex'),
    S3_BUCKET: `test-${randomBytes(6).toString('hex')}`,
    DEMO: '0',
    LOG_LEVEL: 'silent',
    PUBLIC_URL: 'http://localhost:4180',
    ...environment,
  });
  const app = await NestFactory.create<NestExpressApplication>(AppModule, {
    logger: ['error'],
    abortOnError: false,
  });
  configureApplication(app);
  await app.listen(0, '127.0.0.1');
  const { port } = app.getHttpServer().address() as AddressInfo;
  const url = `http://127.0.0.1:${String(port)}`;
  return {
    app,
    url,
    databaseUrl: database.url,
    agent: () => supertest.agent(url),
    source: app.get(DataSource),
    clock: app.get(Clock),
    outbox: app.get(Outbox),
    close: async () => {
      await app.close();
      await database.drop();
    },
  };
}

/** A service of the running application. */
export const serviceOf = <T>(app: INestApplicationContext, type: new (...parts: never[]) => T): T =>
  app.get<T>(type, { strict: false });

async function prepareSchema(url: string): Promise<void> {
  const source = await makeDataSource(url).initialize();
  if (source.migrations.length > 0) await source.runMigrations();
  else await source.synchronize();
  await source.destroy();
}
