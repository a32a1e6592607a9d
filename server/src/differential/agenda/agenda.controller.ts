import { Body, Controller, Delete, Param, Put, Query } from '@nestjs/common';
import { doneSchema } from '@weighhouse/shared/contracts/common';
import {
  type AgendaItem,
  agendaItemSchema,
  type PutOnAgenda,
  putOnAgendaSchema,
  takeOffAgendaSchema,
} from '@weighhouse/shared/contracts/differential';
import { judgementFindingParamsSchema } from '@weighhouse/shared/contracts/judgements';
import { Access } from '../../platform/http/access.decorator.js';
import { type Actor, CurrentActor } from '../../platform/http/actor.js';
import { Answers } from '../../platform/http/answers.decorator.js';
import { AgendaService } from './agenda.service.js';

/** What the panel discusses first. */
@Controller('api/cases/:caseId/agenda/:findingId')
export class AgendaController {
  constructor(private readonly agenda: AgendaService) {}

  @Put()
  @Access('agenda.change')
  @Answers(agendaItemSchema)
  put(
    @CurrentActor() actor: Actor,
    @Param({ schema: judgementFindingParamsSchema })
    { caseId, findingId }: { caseId: string; findingId: string },
    @Body({ schema: putOnAgendaSchema }) input: PutOnAgenda,
  ): Promise<AgendaItem> {
    return this.agenda.put(actor, caseId, findingId, input);
  }

  @Delete()
  @Access('agenda.change')
  @Answers(doneSchema)
  async takeOff(
    @CurrentActor() actor: Actor,
    @Param({ schema: judgementFindingParamsSchema })
    { caseId, findingId }: { caseId: string; findingId: string },
    @Query({ schema: takeOffAgendaSchema }) { version }: { version?: number | undefined },
  ): Promise<{ done: true }> {
    await this.agenda.takeOff(actor, caseId, findingId, version);
    return { done: true };
  }
}
