import { Inject, Injectable } from '@nestjs/common';
import type { Case } from '@weighhouse/shared/contracts/cases';
import type { Differential } from '@weighhouse/shared/contracts/differential';
import type { Plan } from '@weighhouse/shared/contracts/plans';
import { CaseReadingService } from '../cases/case-reading.service.js';
import { DifferentialService } from '../differential/view/differential.service.js';
import { PlanPages } from '../plans/plan-pages.service.js';
import { Clock } from '../platform/clock/clock.js';
import { type Configuration, CONFIGURATION } from '../platform/config/configuration.js';
import type { Actor } from '../platform/http/actor.js';

/** Everything that an export is made from, as the actor may see it. */
export interface ExportFacts {
  file: Case;
  differential: Differential;
  /** The plan signed last; null before the first. */
  plan: Plan | null;
  now: Date;
  timeZone: string;
}

/** Collects what goes into an export, through the services that answer the same person's pages. */
@Injectable()
export class ExportReader {
  constructor(
    private readonly cases: CaseReadingService,
    private readonly differentials: DifferentialService,
    private readonly plans: PlanPages,
    private readonly clock: Clock,
    @Inject(CONFIGURATION) private readonly configuration: Configuration,
  ) {}

  async read(actor: Actor, caseId: string): Promise<ExportFacts> {
    const file = await this.cases.read(actor, caseId);
    const differential = await this.differentials.read(actor, caseId);
    const { signed } = await this.plans.read(actor, caseId);
    return {
      file,
      differential,
      plan: signed.at(-1) ?? null,
      now: this.clock.now(),
      timeZone: this.configuration.TIME_ZONE,
    };
  }
}
