import { Body, Controller, Param, Post } from '@nestjs/common';
import {
  actionDoneSchema,
  actionParamsSchema,
  type PlanView,
  planViewSchema,
} from '@weighhouse/shared/contracts/plans';
import type { z } from 'zod';
import { Access } from '../platform/http/access.decorator.js';
import { type Actor, CurrentActor } from '../platform/http/actor.js';
import { Answers } from '../platform/http/answers.decorator.js';
import { ActionsService } from './actions.service.js';

@Controller('api/actions/:actionId')
export class ActionsController {
  constructor(private readonly service: ActionsService) {}

  /** Its owner reports an action done; the owner is asked for by the service. */
  @Post('done')
  @Access('signedIn')
  @Answers(planViewSchema)
  done(
    @CurrentActor() actor: Actor,
    @Param({ schema: actionParamsSchema }) { actionId }: z.infer<typeof actionParamsSchema>,
    @Body({ schema: actionDoneSchema }) { words }: z.infer<typeof actionDoneSchema>,
  ): Promise<PlanView> {
    return this.service.done(actor, actionId, words);
  }
}
