import { Body, Controller, Get, Param, Patch, Post } from '@nestjs/common';
import { caseParamsSchema } from '@weighhouse/shared/contracts/common';
import {
  type ChangeFinding,
  changeFindingSchema,
  enteredInErrorSchema,
  type Finding,
  findingListSchema,
  findingParamsSchema,
  findingSchema,
  type NewFinding,
  newFindingSchema,
} from '@weighhouse/shared/contracts/findings';
import { Access } from '../platform/http/access.decorator.js';
import { type Actor, CurrentActor } from '../platform/http/actor.js';
import { Answers } from '../platform/http/answers.decorator.js';
import { FindingChanges } from './finding-changes.service.js';
import { FindingsService } from './findings.service.js';

@Controller('api')
export class FindingsController {
  constructor(
    private readonly findings: FindingsService,
    private readonly changes: FindingChanges,
  ) {}

  @Post('cases/:caseId/findings')
  @Access('finding.add')
  @Answers(findingSchema, 201)
  add(
    @CurrentActor() actor: Actor,
    @Param({ schema: caseParamsSchema }) { caseId }: { caseId: string },
    @Body({ schema: newFindingSchema }) input: NewFinding,
  ): Promise<Finding> {
    return this.changes.add(actor, caseId, input);
  }

  /** Every finding in panel order, those entered in error among them. */
  @Get('cases/:caseId/findings')
  @Access('finding.read')
  @Answers(findingListSchema)
  list(
    @CurrentActor() actor: Actor,
    @Param({ schema: caseParamsSchema }) { caseId }: { caseId: string },
  ): Promise<{ items: Finding[] }> {
    return this.findings.list(actor, caseId);
  }

  @Patch('findings/:findingId')
  @Access('finding.change')
  @Answers(findingSchema)
  change(
    @CurrentActor() actor: Actor,
    @Param({ schema: findingParamsSchema }) { findingId }: { findingId: string },
    @Body({ schema: changeFindingSchema }) input: ChangeFinding,
  ): Promise<Finding> {
    return this.changes.change(actor, findingId, input);
  }

  /** The finding stays in the trail and counts nowhere. */
  @Post('findings/:findingId/entered-in-error')
  @Access('finding.change')
  @Answers(findingSchema)
  enteredInError(
    @CurrentActor() actor: Actor,
    @Param({ schema: findingParamsSchema }) { findingId }: { findingId: string },
    @Body({ schema: enteredInErrorSchema }) { words }: { words: string },
  ): Promise<Finding> {
    return this.changes.enteredInError(actor, findingId, words);
  }
}
