import { Body, Controller, Param, Post } from '@nestjs/common';
import { caseParamsSchema } from '@weighhouse/shared/contracts/common';
import { dissentSchema, type PlanView, planViewSchema } from '@weighhouse/shared/contracts/plans';
import type { z } from 'zod';
import { Access } from '../platform/http/access.decorator.js';
import { type Actor, CurrentActor } from '../platform/http/actor.js';
import { Answers } from '../platform/http/answers.decorator.js';
import { StancesService } from './stances.service.js';

type Params = z.infer<typeof caseParamsSchema>;

@Controller('api/cases/:caseId')
@Access('plan.stance')
export class StancesController {
  constructor(private readonly service: StancesService) {}

  @Post('agree')
  @Answers(planViewSchema)
  agree(
    @CurrentActor() actor: Actor,
    @Param({ schema: caseParamsSchema }) { caseId }: Params,
  ): Promise<PlanView> {
    return this.service.give(actor, caseId, null);
  }

  @Post('dissent')
  @Answers(planViewSchema)
  dissent(
    @CurrentActor() actor: Actor,
    @Param({ schema: caseParamsSchema }) { caseId }: Params,
    @Body({ schema: dissentSchema }) { words }: z.infer<typeof dissentSchema>,
  ): Promise<PlanView> {
    return this.service.give(actor, caseId, words);
  }
}
