import { Module } from '@nestjs/common';
import { CasesModule } from '../cases/cases.module.js';
import { FindingsModule } from '../findings/findings.module.js';
import { PeopleModule } from '../people/people.module.js';
import { AgendaController } from './agenda/agenda.controller.js';
import { AgendaReader } from './agenda/agenda-reader.js';
import { AgendaService } from './agenda/agenda.service.js';
import { Assessor } from './assessing/assessor.js';
import { DraftsController } from './judgements/drafts.controller.js';
import { DraftsService } from './judgements/drafts.service.js';
import { JudgementStore } from './judgements/judgement-store.js';
import { JudgementWriter } from './judgements/judgement-writer.js';
import { JudgementsController } from './judgements/judgements.controller.js';
import { JudgementsService } from './judgements/judgements.service.js';
import { OwnJudgements } from './judgements/own-judgements.js';
import { Assessments } from './pool/assessments.js';
import { Evidence } from './pool/evidence.js';
import { PoolReader } from './pool/pool-reader.js';
import { Snapshots } from './pool/snapshots.js';
import { StandingService } from './pool/standing.service.js';
import { CaseRoundsController } from './rounds/case-rounds.controller.js';
import { EndRoundsService } from './rounds/end-rounds.service.js';
import { HandInsService } from './rounds/hand-ins.service.js';
import { OpenRoundsService } from './rounds/open-rounds.service.js';
import { RoundBeginning } from './rounds/round-beginning.js';
import { RoundReader } from './rounds/round-reader.js';
import { RoundViews } from './rounds/round-views.js';
import { RoundsController } from './rounds/rounds.controller.js';
import { RoundsService } from './rounds/rounds.service.js';
import { SealsController } from './seals/seals.controller.js';
import { SealsService } from './seals/seals.service.js';
import { DifferentialController } from './view/differential.controller.js';
import { DifferentialService } from './view/differential.service.js';
import { LedgerParts } from './view/ledger-parts.service.js';
import { MineService } from './view/mine.service.js';
import { PanelService } from './view/panel.service.js';

const rounds = [
  RoundReader,
  RoundViews,
  RoundsService,
  RoundBeginning,
  OpenRoundsService,
  HandInsService,
  EndRoundsService,
];
const judgements = [JudgementStore, JudgementWriter, JudgementsService, OwnJudgements, DraftsService];
const pool = [Assessor, Evidence, PoolReader, Snapshots, Assessments, StandingService];
const agenda = [AgendaReader, AgendaService];
const views = [DifferentialService, LedgerParts, MineService, PanelService, SealsService];

/** Judging: rounds, judgements and their seals, the pool and where the panel stands. */
@Module({
  imports: [PeopleModule, CasesModule, FindingsModule],
  controllers: [
    CaseRoundsController,
    RoundsController,
    JudgementsController,
    DraftsController,
    DifferentialController,
    AgendaController,
    SealsController,
  ],
  providers: [...rounds, ...judgements, ...pool, ...agenda, ...views],
  exports: [StandingService, RoundReader, EndRoundsService, DifferentialService, PanelService],
})
export class DifferentialModule {}
