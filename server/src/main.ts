import 'reflect-metadata';
import { NestFactory } from '@nestjs/core';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { AppModule } from './app.module.js';
import { type Configuration, CONFIGURATION } from './platform/config/configuration.js';
import { configureApplication } from './platform/http/application.js';

const app = await NestFactory.create<NestExpressApplication>(AppModule, {
  logger: ['error', 'warn', 'log'],
  abortOnError: false,
}).catch((error: unknown) => {
  process.stderr.write(`${error instanceof Error ? error.message : String(error)}\n`);
  process.exit(1);
});
configureApplication(app);
const { PORT, HOST } = app.get<Configuration>(CONFIGURATION);
await app.listen(PORT, HOST);
