import { Body, Controller, Get, Param, Post } from '@nestjs/common';
import { caseParamsSchema } from '@weighhouse/shared/contracts/common';
import {
  type Candidate,
  candidateParamsSchema,
  candidateSchema,
  type CandidateSet,
  candidateSetSchema,
  type NewCandidate,
  newCandidateSchema,
  retireSchema,
} from '@weighhouse/shared/contracts/findings';
import { Access } from '../platform/http/access.decorator.js';
import { type Actor, CurrentActor } from '../platform/http/actor.js';
import { Answers } from '../platform/http/answers.decorator.js';
import { CandidateChanges } from './candidate-changes.service.js';
import { CandidatesService } from './candidates.service.js';

@Controller('api')
export class CandidatesController {
  constructor(
    private readonly candidates: CandidatesService,
    private readonly changes: CandidateChanges,
  ) {}

  @Post('cases/:caseId/candidates')
  @Access('candidate.add')
  @Answers(candidateSchema, 201)
  add(
    @CurrentActor() actor: Actor,
    @Param({ schema: caseParamsSchema }) { caseId }: { caseId: string },
    @Body({ schema: newCandidateSchema }) input: NewCandidate,
  ): Promise<Candidate> {
    return this.changes.add(actor, caseId, input);
  }

  /** The candidate set in force. None of these is always the last column and not listed. */
  @Get('cases/:caseId/candidates')
  @Access('candidate.read')
  @Answers(candidateSetSchema)
  list(
    @CurrentActor() actor: Actor,
    @Param({ schema: caseParamsSchema }) { caseId }: { caseId: string },
  ): Promise<CandidateSet> {
    return this.candidates.list(actor, caseId);
  }

  /** Answers the next candidate set. */
  @Post('candidates/:candidateId/retire')
  @Access('candidate.retire')
  @Answers(candidateSetSchema)
  retire(
    @CurrentActor() actor: Actor,
    @Param({ schema: candidateParamsSchema }) { candidateId }: { candidateId: string },
    @Body({ schema: retireSchema }) { words }: { words?: string },
  ): Promise<CandidateSet> {
    return this.changes.retire(actor, candidateId, words);
  }
}
