import { Module } from '@nestjs/common';
import { PeopleModule } from '../people/people.module.js';
import { AcceptService } from './accept.service.js';
import { CaseAccess } from './case-access.js';
import { CaseChanges } from './case-changes.js';
import { CaseDirectory } from './case-directory.js';
import { CaseFacts } from './case-facts.js';
import { CaseLetters } from './case-letters.js';
import { CaseListService } from './case-list.service.js';
import { CaseMovesController } from './case-moves.controller.js';
import { CaseReadingService } from './case-reading.service.js';
import { CaseViews } from './case-views.js';
import { CasesController } from './cases.controller.js';
import { ChairMoves } from './chair-moves.service.js';
import { DraftsService } from './drafts.service.js';
import { ReferrerMoves } from './referrer-moves.service.js';
import { TeamController } from './team.controller.js';
import { TeamReader } from './team-reader.js';
import { TeamSeats } from './team-seats.js';
import { TeamService } from './team.service.js';
import { TeamWriter } from './team-writer.js';

/** What every later domain builds on. */
const foundations = [CaseAccess, CaseChanges, CaseDirectory, CaseFacts, CaseLetters, TeamReader];
/** The moves, for whoever makes them without a browser, such as the demonstration's seed. */
const moves = [DraftsService, ReferrerMoves, ChairMoves, AcceptService, TeamService];

/** Cases: their drafts, their teams and the moves of their life. */
@Module({
  imports: [PeopleModule],
  controllers: [CasesController, CaseMovesController, TeamController],
  providers: [
    ...foundations,
    ...moves,
    CaseListService,
    CaseReadingService,
    CaseViews,
    TeamSeats,
    TeamWriter,
  ],
  exports: [...foundations, ...moves, CaseListService, CaseReadingService],
})
export class CasesModule {}
