import { Module } from '@nestjs/common';
import { CasesModule } from '../cases/cases.module.js';
import { DifferentialModule } from '../differential/differential.module.js';
import { PlansModule } from '../plans/plans.module.js';
import { SummariesModule } from '../summaries/summaries.module.js';
import { TodayController } from './today.controller.js';
import { TodayService } from './today.service.js';
import { Waiting } from './waiting.js';
import { WaitingActions } from './waiting-actions.js';
import { WaitingReferrals } from './waiting-referrals.js';
import { WaitingRounds } from './waiting-rounds.js';
import { WaitingTelling } from './waiting-telling.js';

/** What waits for each person, collected from the other domains. */
@Module({
  imports: [CasesModule, DifferentialModule, PlansModule, SummariesModule],
  controllers: [TodayController],
  providers: [TodayService, Waiting, WaitingReferrals, WaitingRounds, WaitingActions, WaitingTelling],
})
export class TodayModule {}
