import { Body, Controller, Param, Post } from '@nestjs/common';
import {
  handInInputSchema,
  handInSchema,
  type Round,
  roundParamsSchema,
  roundSchema,
  unsealSchema,
} from '@weighhouse/shared/contracts/rounds';
import type { z } from 'zod';
import { Access } from '../../platform/http/access.decorator.js';
import { type Actor, CurrentActor } from '../../platform/http/actor.js';
import { Answers } from '../../platform/http/answers.decorator.js';
import { EndRoundsService } from './end-rounds.service.js';
import { HandInsService } from './hand-ins.service.js';

/** What is done to one round. A move without a body counts as one with an empty body. */
@Controller('api/rounds/:roundId')
export class RoundsController {
  constructor(
    private readonly handIns: HandInsService,
    private readonly endRounds: EndRoundsService,
  ) {}

  @Post('hand-in')
  @Access('judgement.handIn')
  @Answers(handInSchema)
  handIn(
    @CurrentActor() actor: Actor,
    @Param({ schema: roundParamsSchema }) { roundId }: { roundId: string },
    @Body({ schema: handInInputSchema.prefault({}) }) input: z.infer<typeof handInInputSchema>,
  ): Promise<z.infer<typeof handInSchema>> {
    return this.handIns.handIn(actor, roundId, input);
  }

  @Post('unseal')
  @Access('round.unseal')
  @Answers(roundSchema)
  unseal(
    @CurrentActor() actor: Actor,
    @Param({ schema: roundParamsSchema }) { roundId }: { roundId: string },
    @Body({ schema: unsealSchema.prefault({}) }) { reason }: z.infer<typeof unsealSchema>,
  ): Promise<Round> {
    return this.endRounds.unseal(actor, roundId, reason);
  }

  @Post('close')
  @Access('round.close')
  @Answers(roundSchema)
  close(
    @CurrentActor() actor: Actor,
    @Param({ schema: roundParamsSchema }) { roundId }: { roundId: string },
  ): Promise<Round> {
    return this.endRounds.close(actor, roundId);
  }
}
