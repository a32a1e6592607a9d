import { Controller, Get, Param, Query } from '@nestjs/common';
import { caseParamsSchema } from '@weighhouse/shared/contracts/common';
import { type TrailEntry, trailQuerySchema, trailSchema } from '@weighhouse/shared/contracts/trail';
import { Access } from '../platform/http/access.decorator.js';
import { type Actor, CurrentActor } from '../platform/http/actor.js';
import { Answers } from '../platform/http/answers.decorator.js';
import { TrailService } from './trail.service.js';

@Controller('api/cases/:caseId/trail')
export class TrailController {
  constructor(private readonly trail: TrailService) {}

  @Get()
  @Access('trail.read')
  @Answers(trailSchema)
  read(
    @CurrentActor() actor: Actor,
    @Param({ schema: caseParamsSchema }) { caseId }: { caseId: string },
    @Query({ schema: trailQuerySchema }) query: { page: number; size: number },
  ): Promise<{ items: TrailEntry[]; total: number }> {
    return this.trail.read(actor, caseId, query);
  }
}
