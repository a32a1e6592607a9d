import { Controller, Get, Param } from '@nestjs/common';
import { caseParamsSchema } from '@weighhouse/shared/contracts/common';
import { type Seal, sealListSchema } from '@weighhouse/shared/contracts/rounds';
import { Access } from '../../platform/http/access.decorator.js';
import { type Actor, CurrentActor } from '../../platform/http/actor.js';
import { Answers } from '../../platform/http/answers.decorator.js';
import { SealsService } from './seals.service.js';

/** The seals of a case's hand-ins. */
@Controller('api/cases/:caseId/seals')
export class SealsController {
  constructor(private readonly seals: SealsService) {}

  @Get()
  @Access('seal.read')
  @Answers(sealListSchema)
  list(
    @CurrentActor() actor: Actor,
    @Param({ schema: caseParamsSchema }) { caseId }: { caseId: string },
  ): Promise<{ items: Seal[] }> {
    return this.seals.list(actor, caseId);
  }
}
