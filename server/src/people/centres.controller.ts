import { Body, Controller, Get, Post } from '@nestjs/common';
import {
  type Centre,
  centreListSchema,
  centreSchema,
  newCentreSchema,
} from '@weighhouse/shared/contracts/people';
import type { z } from 'zod';
import { Access } from '../platform/http/access.decorator.js';
import { type Actor, CurrentActor } from '../platform/http/actor.js';
import { Answers } from '../platform/http/answers.decorator.js';
import { CentresService } from './centres.service.js';

@Controller('api/centres')
export class CentresController {
  constructor(private readonly service: CentresService) {}

  @Get()
  @Access('people.list')
  @Answers(centreListSchema)
  async list(): Promise<{ items: Centre[] }> {
    return { items: await this.service.list() };
  }

  @Post()
  @Access('people.manage')
  @Answers(centreSchema, 201)
  add(
    @CurrentActor() actor: Actor,
    @Body({ schema: newCentreSchema }) input: z.infer<typeof newCentreSchema>,
  ): Promise<Centre> {
    return this.service.add(actor, input);
  }
}
