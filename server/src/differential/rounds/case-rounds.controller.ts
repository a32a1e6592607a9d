import { Body, Controller, Get, Param, Post } from '@nestjs/common';
import { caseParamsSchema } from '@weighhouse/shared/contracts/common';
import {
  openRoundSchema,
  type Round,
  roundListSchema,
  roundSchema,
} from '@weighhouse/shared/contracts/rounds';
import type { z } from 'zod';
import { Access } from '../../platform/http/access.decorator.js';
import { type Actor, CurrentActor } from '../../platform/http/actor.js';
import { Answers } from '../../platform/http/answers.decorator.js';
import { OpenRoundsService } from './open-rounds.service.js';
import { RoundsService } from './rounds.service.js';

/** The rounds of a case. */
@Controller('api/cases/:caseId/rounds')
export class CaseRoundsController {
  constructor(
    private readonly rounds: RoundsService,
    private readonly openRounds: OpenRoundsService,
  ) {}

  @Get()
  @Access('round.read')
  @Answers(roundListSchema)
  list(
    @CurrentActor() actor: Actor,
    @Param({ schema: caseParamsSchema }) { caseId }: { caseId: string },
  ): Promise<{ items: Round[] }> {
    return this.rounds.list(actor, caseId);
  }

  @Post()
  @Access('round.open')
  @Answers(roundSchema, 201)
  open(
    @CurrentActor() actor: Actor,
    @Param({ schema: caseParamsSchema }) { caseId }: { caseId: string },
    @Body({ schema: openRoundSchema }) input: z.infer<typeof openRoundSchema>,
  ): Promise<Round> {
    return this.openRounds.open(actor, caseId, input);
  }
}
