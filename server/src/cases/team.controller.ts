import { Body, Controller, Param, Put } from '@nestjs/common';
import {
  type TeamMember,
  type TeamMemberInput,
  teamInputSchema,
  teamSchema,
} from '@weighhouse/shared/contracts/cases';
import { caseParamsSchema } from '@weighhouse/shared/contracts/common';
import { Access } from '../platform/http/access.decorator.js';
import { type Actor, CurrentActor } from '../platform/http/actor.js';
import { Answers } from '../platform/http/answers.decorator.js';
import { TeamService } from './team.service.js';

@Controller('api/cases/:caseId/team')
export class TeamController {
  constructor(private readonly team: TeamService) {}

  /** Sets the whole team. */
  @Put()
  @Access('team.set')
  @Answers(teamSchema)
  set(
    @CurrentActor() actor: Actor,
    @Param({ schema: caseParamsSchema }) { caseId }: { caseId: string },
    @Body({ schema: teamInputSchema }) input: TeamMemberInput[],
  ): Promise<{ items: TeamMember[] }> {
    return this.team.set(actor, caseId, input);
  }
}
