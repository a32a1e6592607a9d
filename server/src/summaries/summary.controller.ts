import { Body, Controller, Get, Param, Post, Put } from '@nestjs/common';
import { wordsInputSchema } from '@weighhouse/shared/contracts/cases';
import { caseParamsSchema } from '@weighhouse/shared/contracts/common';
import {
  approveSummarySchema,
  type Summary,
  type SummaryInput,
  summaryInputSchema,
  summarySchema,
} from '@weighhouse/shared/contracts/summaries';
import type { z } from 'zod';
import { Access } from '../platform/http/access.decorator.js';
import { type Actor, CurrentActor } from '../platform/http/actor.js';
import { Answers } from '../platform/http/answers.decorator.js';
import { ReviewSummaryService } from './review-summary.service.js';
import { SummaryPages } from './summary-pages.service.js';
import { WriteSummaryService } from './write-summary.service.js';

type Params = z.infer<typeof caseParamsSchema>;

@Controller('api/cases/:caseId/summary')
export class SummaryController {
  constructor(
    private readonly pages: SummaryPages,
    private readonly writing: WriteSummaryService,
    private readonly review: ReviewSummaryService,
  ) {}

  /** The text; before anything is saved, the one made from the signed plan. */
  @Get()
  @Access('summary.read')
  @Answers(summarySchema)
  read(
    @CurrentActor() actor: Actor,
    @Param({ schema: caseParamsSchema }) { caseId }: Params,
  ): Promise<Summary> {
    return this.pages.read(actor, caseId);
  }

  @Put()
  @Access('summary.write')
  @Answers(summarySchema)
  save(
    @CurrentActor() actor: Actor,
    @Param({ schema: caseParamsSchema }) { caseId }: Params,
    @Body({ schema: summaryInputSchema }) input: SummaryInput,
  ): Promise<Summary> {
    return this.writing.save(actor, caseId, input);
  }

  @Post('approve')
  @Access('summary.approve')
  @Answers(summarySchema)
  approve(
    @CurrentActor() actor: Actor,
    @Param({ schema: caseParamsSchema }) { caseId }: Params,
    @Body({ schema: approveSummarySchema }) { version }: z.infer<typeof approveSummarySchema>,
  ): Promise<Summary> {
    return this.review.approve(actor, caseId, version);
  }

  @Post('return')
  @Access('summary.approve')
  @Answers(summarySchema)
  giveBack(
    @CurrentActor() actor: Actor,
    @Param({ schema: caseParamsSchema }) { caseId }: Params,
    @Body({ schema: wordsInputSchema }) { words }: z.infer<typeof wordsInputSchema>,
  ): Promise<Summary> {
    return this.review.giveBack(actor, caseId, words);
  }
}
