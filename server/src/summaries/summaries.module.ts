import { Module } from '@nestjs/common';
import { CasesModule } from '../cases/cases.module.js';
import { FindingsModule } from '../findings/findings.module.js';
import { PeopleModule } from '../people/people.module.js';
import { PlansModule } from '../plans/plans.module.js';
import { ContactsController } from './contacts.controller.js';
import { ContactsService } from './contacts.service.js';
import { IdentityBoxes } from './identity-boxes.js';
import { IdentityCardsService } from './identity-cards.service.js';
import { IdentityController } from './identity.controller.js';
import { ReviewSummaryService } from './review-summary.service.js';
import { SummaryController } from './summary.controller.js';
import { SummaryLetters } from './summary-letters.js';
import { SummaryPages } from './summary-pages.service.js';
import { SummaryReader } from './summary-reader.js';
import { SummaryWriter } from './summary-writer.js';
import { TellListController } from './tell-list.controller.js';
import { TellListService } from './tell-list.service.js';
import { WaitingSummaries } from './waiting-summaries.js';
import { WriteSummaryService } from './write-summary.service.js';

/** What the patient is told, by whom and when; and who the patient is. */
@Module({
  imports: [PeopleModule, CasesModule, FindingsModule, PlansModule],
  controllers: [SummaryController, ContactsController, TellListController, IdentityController],
  providers: [
    SummaryReader,
    SummaryWriter,
    SummaryLetters,
    SummaryPages,
    WriteSummaryService,
    ReviewSummaryService,
    ContactsService,
    TellListService,
    WaitingSummaries,
    IdentityBoxes,
    IdentityCardsService,
  ],
  exports: [
    TellListService,
    WaitingSummaries,
    IdentityCardsService,
    WriteSummaryService,
    ReviewSummaryService,
    ContactsService,
  ],
})
export class SummariesModule {}
