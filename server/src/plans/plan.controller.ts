import { Body, Controller, Get, Param, Post, Put } from '@nestjs/common';
import { caseParamsSchema } from '@weighhouse/shared/contracts/common';
import {
  concludeSchema,
  type PlanInput,
  planInputSchema,
  type PlanView,
  planViewSchema,
} from '@weighhouse/shared/contracts/plans';
import type { z } from 'zod';
import { Access } from '../platform/http/access.decorator.js';
import { type Actor, CurrentActor } from '../platform/http/actor.js';
import { Answers } from '../platform/http/answers.decorator.js';
import { AskService } from './ask.service.js';
import { ConcludeService } from './conclude.service.js';
import { DraftPlanService } from './draft-plan.service.js';
import { PlanPages } from './plan-pages.service.js';

type Params = z.infer<typeof caseParamsSchema>;

@Controller('api/cases/:caseId')
export class PlanController {
  constructor(
    private readonly pages: PlanPages,
    private readonly drafts: DraftPlanService,
    private readonly asking: AskService,
    private readonly conclusions: ConcludeService,
  ) {}

  /** The draft, the signed plans and what concluding still needs. */
  @Get('plan')
  @Access('plan.read')
  @Answers(planViewSchema)
  read(
    @CurrentActor() actor: Actor,
    @Param({ schema: caseParamsSchema }) { caseId }: Params,
  ): Promise<PlanView> {
    return this.pages.read(actor, caseId);
  }

  @Put('plan')
  @Access('plan.write')
  @Answers(planViewSchema)
  save(
    @CurrentActor() actor: Actor,
    @Param({ schema: caseParamsSchema }) { caseId }: Params,
    @Body({ schema: planInputSchema }) input: PlanInput,
  ): Promise<PlanView> {
    return this.drafts.save(actor, caseId, input);
  }

  /** Asks the contributors for agreement or dissent, by letter. */
  @Post('plan/ask')
  @Access('plan.ask')
  @Answers(planViewSchema)
  ask(
    @CurrentActor() actor: Actor,
    @Param({ schema: caseParamsSchema }) { caseId }: Params,
  ): Promise<PlanView> {
    return this.asking.ask(actor, caseId);
  }

  /** Signs the draft, which closes the case. Asks for the password again. */
  @Post('conclude')
  @Access('plan.conclude')
  @Answers(planViewSchema)
  conclude(
    @CurrentActor() actor: Actor,
    @Param({ schema: caseParamsSchema }) { caseId }: Params,
    @Body({ schema: concludeSchema }) { password }: z.infer<typeof concludeSchema>,
  ): Promise<PlanView> {
    return this.conclusions.conclude(actor, caseId, password);
  }
}
