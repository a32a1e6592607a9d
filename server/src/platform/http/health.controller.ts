import { Controller, Get } from '@nestjs/common';
import { DataSource } from 'typeorm';
import { z } from 'zod';
import { Refusal } from '../errors/refusal.js';
import { ObjectStore } from '../storage/object-store.js';
import { Access } from './access.decorator.js';
import { Answers } from './answers.decorator.js';

const healthSchema = z.object({ status: z.literal('ok') }).meta({ id: 'Health' });

@Controller('api')
@Access('public')
export class HealthController {
  constructor(
    private readonly source: DataSource,
    private readonly store: ObjectStore,
  ) {}

  /** The process lives. */
  @Get('health')
  @Answers(healthSchema)
  health(): z.infer<typeof healthSchema> {
    return { status: 'ok' };
  }

  /** Database and storage answer, so requests can be served. */
  @Get('ready')
  @Answers(healthSchema)
  async ready(): Promise<z.infer<typeof healthSchema>> {
    try {
      await Promise.all([this.source.query('SELECT 1'), this.store.check()]);
    } catch {
      throw new Refusal('unavailable', 'The database or the file storage does not answer.');
    }
    return { status: 'ok' };
  }
}
