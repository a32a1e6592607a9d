import { Module } from '@nestjs/common';
import { CasesModule } from '../cases/cases.module.js';
import { DifferentialModule } from '../differential/differential.module.js';
import { FindingsModule } from '../findings/findings.module.js';
import { PeopleModule } from '../people/people.module.js';
import { ActionsController } from './actions.controller.js';
import { ActionsService } from './actions.service.js';
import { AskService } from './ask.service.js';
import { Asking } from './asking.js';
import { ConcludeCase } from './conclude-case.js';
import { ConcludeService } from './conclude.service.js';
import { Conclusion } from './conclusion.js';
import { DraftPlanService } from './draft-plan.service.js';
import { DraftWriter } from './draft-writer.js';
import { PlanController } from './plan.controller.js';
import { PlanLetters } from './plan-letters.js';
import { PlanPages } from './plan-pages.service.js';
import { PlanReader } from './plan-reader.js';
import { Signing } from './signing.js';
import { StancesController } from './stances.controller.js';
import { StancesService } from './stances.service.js';
import { WaitingPlans } from './waiting-plans.js';

/** What the panel agrees on: the draft, what contributors say of it, the signature, and the actions. */
@Module({
  imports: [PeopleModule, CasesModule, FindingsModule, DifferentialModule],
  controllers: [PlanController, StancesController, ActionsController],
  providers: [
    PlanReader,
    PlanPages,
    PlanLetters,
    DraftWriter,
    DraftPlanService,
    Asking,
    AskService,
    StancesService,
    Conclusion,
    Signing,
    ConcludeCase,
    ConcludeService,
    ActionsService,
    WaitingPlans,
  ],
  exports: [
    PlanReader,
    PlanPages,
    PlanLetters,
    WaitingPlans,
    DraftPlanService,
    AskService,
    StancesService,
    ConcludeService,
  ],
})
export class PlansModule {}
