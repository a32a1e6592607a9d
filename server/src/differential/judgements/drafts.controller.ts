import { Body, Controller, Delete, Param, Put } from '@nestjs/common';
import { doneSchema } from '@weighhouse/shared/contracts/common';
import {
  draftParamsSchema,
  type JudgementDraft,
  type JudgementDraftInput,
  judgementDraftInputSchema,
  judgementDraftSchema,
} from '@weighhouse/shared/contracts/judgements';
import { Access } from '../../platform/http/access.decorator.js';
import { type Actor, CurrentActor } from '../../platform/http/actor.js';
import { Answers } from '../../platform/http/answers.decorator.js';
import { DraftsService } from './drafts.service.js';

/** One's own drafts, private until they are saved. */
@Controller('api/cases/:caseId/judgement/drafts')
export class DraftsController {
  constructor(private readonly drafts: DraftsService) {}

  @Put(':target')
  @Access('judgement.draft')
  @Answers(judgementDraftSchema)
  keep(
    @CurrentActor() actor: Actor,
    @Param({ schema: draftParamsSchema }) { caseId, target }: { caseId: string; target: string },
    @Body({ schema: judgementDraftInputSchema }) input: JudgementDraftInput,
  ): Promise<JudgementDraft> {
    return this.drafts.keep(actor, caseId, target, input);
  }

  @Delete(':target')
  @Access('judgement.draft')
  @Answers(doneSchema)
  async drop(
    @CurrentActor() actor: Actor,
    @Param({ schema: draftParamsSchema }) { caseId, target }: { caseId: string; target: string },
  ): Promise<{ done: true }> {
    await this.drafts.drop(actor, caseId, target);
    return { done: true };
  }
}
