import 'reflect-metadata';
import { NestFactory } from '@nestjs/core';
import { AppModule } from '@weighhouse/server/app.module';
import { seedDemo } from './demo/seed-demo.js';

const app = await NestFactory.createApplicationContext(AppModule, {
  logger: ['error', 'warn'],
  abortOnError: false,
});
try {
  process.stdout.write(`${await seedDemo(app)}\n`);
} catch (error) {
  process.stderr.write(`${error instanceof Error ? error.message : String(error)}\n`);
  process.exitCode = 1;
} finally {
  await app.close();
}
