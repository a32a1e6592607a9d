import { Body, Controller, Get, Param, Put } from '@nestjs/common';
import { caseParamsSchema } from '@weighhouse/shared/contracts/common';
import {
  type Identity,
  type IdentityInput,
  identityInputSchema,
  identitySchema,
} from '@weighhouse/shared/contracts/summaries';
import type { z } from 'zod';
import { Access } from '../platform/http/access.decorator.js';
import { type Actor, CurrentActor } from '../platform/http/actor.js';
import { Answers } from '../platform/http/answers.decorator.js';
import { IdentityCardsService } from './identity-cards.service.js';

type Params = z.infer<typeof caseParamsSchema>;

@Controller('api/cases/:caseId/identity')
export class IdentityController {
  constructor(private readonly service: IdentityCardsService) {}

  /** Opens the identity card; the opening is written into the trail. */
  @Get()
  @Access('identity.read')
  @Answers(identitySchema)
  read(
    @CurrentActor() actor: Actor,
    @Param({ schema: caseParamsSchema }) { caseId }: Params,
  ): Promise<Identity> {
    return this.service.read(actor, caseId);
  }

  @Put()
  @Access('identity.write')
  @Answers(identitySchema)
  write(
    @CurrentActor() actor: Actor,
    @Param({ schema: caseParamsSchema }) { caseId }: Params,
    @Body({ schema: identityInputSchema }) input: IdentityInput,
  ): Promise<Identity> {
    return this.service.write(actor, caseId, input);
  }
}
