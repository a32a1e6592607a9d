import { Body, Controller, Get, Param, Patch, Post, Query } from '@nestjs/common';
import {
  type Case,
  type CaseListItem,
  type CaseQuery,
  caseListSchema,
  caseQuerySchema,
  caseSchema,
  type ChangeDraft,
  changeDraftSchema,
  type NewCase,
  newCaseSchema,
} from '@weighhouse/shared/contracts/cases';
import { caseParamsSchema } from '@weighhouse/shared/contracts/common';
import { Access } from '../platform/http/access.decorator.js';
import { type Actor, CurrentActor } from '../platform/http/actor.js';
import { Answers } from '../platform/http/answers.decorator.js';
import { CaseListService } from './case-list.service.js';
import { CaseReadingService } from './case-reading.service.js';
import { DraftsService } from './drafts.service.js';

@Controller('api/cases')
export class CasesController {
  constructor(
    private readonly drafts: DraftsService,
    private readonly lists: CaseListService,
    private readonly reading: CaseReadingService,
  ) {}

  /** Opens a draft. */
  @Post()
  @Access('case.open')
  @Answers(caseSchema, 201)
  open(@CurrentActor() actor: Actor, @Body({ schema: newCaseSchema }) input: NewCase): Promise<Case> {
    return this.drafts.open(actor, input);
  }

  /** The cases that one may open. */
  @Get()
  @Access('signedIn')
  @Answers(caseListSchema)
  list(
    @CurrentActor() actor: Actor,
    @Query({ schema: caseQuerySchema }) query: CaseQuery,
  ): Promise<{ items: CaseListItem[]; total: number }> {
    return this.lists.list(actor, query);
  }

  @Get(':caseId')
  @Access('case.read')
  @Answers(caseSchema)
  read(
    @CurrentActor() actor: Actor,
    @Param({ schema: caseParamsSchema }) { caseId }: { caseId: string },
  ): Promise<Case> {
    return this.reading.read(actor, caseId);
  }

  /** Saves the draft. */
  @Patch(':caseId')
  @Access('case.edit')
  @Answers(caseSchema)
  change(
    @CurrentActor() actor: Actor,
    @Param({ schema: caseParamsSchema }) { caseId }: { caseId: string },
    @Body({ schema: changeDraftSchema }) input: ChangeDraft,
  ): Promise<Case> {
    return this.drafts.change(actor, caseId, input);
  }
}
