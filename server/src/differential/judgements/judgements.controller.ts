import { Body, Controller, Param, Put } from '@nestjs/common';
import { caseParamsSchema } from '@weighhouse/shared/contracts/common';
import {
  type JudgeFinding,
  judgeFindingSchema,
  judgementFindingParamsSchema,
  type JudgePrior,
  judgePriorSchema,
  type SavedJudgement,
  savedJudgementSchema,
} from '@weighhouse/shared/contracts/judgements';
import { Access } from '../../platform/http/access.decorator.js';
import { type Actor, CurrentActor } from '../../platform/http/actor.js';
import { Answers } from '../../platform/http/answers.decorator.js';
import { JudgementsService } from './judgements.service.js';

/** One's own prior and likelihoods. */
@Controller('api/cases/:caseId/judgement')
export class JudgementsController {
  constructor(private readonly judgements: JudgementsService) {}

  @Put('prior')
  @Access('judgement.give')
  @Answers(savedJudgementSchema)
  savePrior(
    @CurrentActor() actor: Actor,
    @Param({ schema: caseParamsSchema }) { caseId }: { caseId: string },
    @Body({ schema: judgePriorSchema }) input: JudgePrior,
  ): Promise<SavedJudgement> {
    return this.judgements.savePrior(actor, caseId, input);
  }

  @Put('findings/:findingId')
  @Access('judgement.give')
  @Answers(savedJudgementSchema)
  saveRow(
    @CurrentActor() actor: Actor,
    @Param({ schema: judgementFindingParamsSchema })
    { caseId, findingId }: { caseId: string; findingId: string },
    @Body({ schema: judgeFindingSchema }) input: JudgeFinding,
  ): Promise<SavedJudgement> {
    return this.judgements.saveRow(actor, caseId, findingId, input);
  }
}
