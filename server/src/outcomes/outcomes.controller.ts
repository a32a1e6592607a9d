import { Body, Controller, Get, Param, Post } from '@nestjs/common';
import { caseParamsSchema } from '@weighhouse/shared/contracts/common';
import {
  type Outcome,
  type OutcomeInput,
  outcomeInputSchema,
  outcomeSchema,
} from '@weighhouse/shared/contracts/outcomes';
import type { z } from 'zod';
import { Access } from '../platform/http/access.decorator.js';
import { type Actor, CurrentActor } from '../platform/http/actor.js';
import { Answers } from '../platform/http/answers.decorator.js';
import { OutcomesService } from './outcomes.service.js';

type Params = z.infer<typeof caseParamsSchema>;

@Controller('api/cases/:caseId/outcome')
export class OutcomesController {
  constructor(private readonly service: OutcomesService) {}

  /** Null while it is not known. */
  @Get()
  @Access('outcome.read')
  @Answers(outcomeSchema.nullable())
  read(
    @CurrentActor() actor: Actor,
    @Param({ schema: caseParamsSchema }) { caseId }: Params,
  ): Promise<Outcome | null> {
    return this.service.read(actor, caseId);
  }

  @Post()
  @Access('outcome.record')
  @Answers(outcomeSchema)
  record(
    @CurrentActor() actor: Actor,
    @Param({ schema: caseParamsSchema }) { caseId }: Params,
    @Body({ schema: outcomeInputSchema }) input: OutcomeInput,
  ): Promise<Outcome | null> {
    return this.service.record(actor, caseId, input);
  }
}
