import { Controller, Get, Param } from '@nestjs/common';
import { caseParamsSchema } from '@weighhouse/shared/contracts/common';
import {
  type Differential,
  differentialSchema,
  panelSchema,
  type PanelView,
} from '@weighhouse/shared/contracts/differential';
import { Access } from '../../platform/http/access.decorator.js';
import { type Actor, CurrentActor } from '../../platform/http/actor.js';
import { Answers } from '../../platform/http/answers.decorator.js';
import { DifferentialService } from './differential.service.js';
import { PanelService } from './panel.service.js';

/** The ledger, and the panel behind it. */
@Controller('api/cases/:caseId')
export class DifferentialController {
  constructor(
    private readonly differentials: DifferentialService,
    private readonly panels: PanelService,
  ) {}

  @Get('differential')
  @Access('differential.read')
  @Answers(differentialSchema)
  differential(
    @CurrentActor() actor: Actor,
    @Param({ schema: caseParamsSchema }) { caseId }: { caseId: string },
  ): Promise<Differential> {
    return this.differentials.read(actor, caseId);
  }

  @Get('panel')
  @Access('panel.read')
  @Answers(panelSchema)
  panel(
    @CurrentActor() actor: Actor,
    @Param({ schema: caseParamsSchema }) { caseId }: { caseId: string },
  ): Promise<PanelView> {
    return this.panels.read(actor, caseId);
  }
}
