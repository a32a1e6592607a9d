import { randomUUID } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import type { Candidate, CandidateSet, NewCandidate } from '@weighhouse/shared/contracts/findings';
import { DataSource, type EntityManager, IsNull } from 'typeorm';
import { CaseAccess } from '../cases/case-access.js';
import { CaseChanges } from '../cases/case-changes.js';
import { Clock } from '../platform/clock/clock.js';
import { UnitOfWork } from '../platform/database/unit-of-work.js';
import { invalid, notFound, Refusal } from '../platform/errors/refusal.js';
import type { Actor } from '../platform/http/actor.js';
import { CandidateRow } from './candidate.entity.js';
import { CandidatesService } from './candidates.service.js';
import { isNoneOfThese, sameName } from './candidate-names.js';

const most = 30;

/** Adds and retires candidates. Each makes the next candidate set, so everybody gives their prior again. */
@Injectable()
export class CandidateChanges {
  constructor(
    private readonly source: DataSource,
    private readonly access: CaseAccess,
    private readonly changes: CaseChanges,
    private readonly candidates: CandidatesService,
    private readonly work: UnitOfWork,
    private readonly clock: Clock,
  ) {}

  /**
   * @throws Refusal 409 `set-frozen` while a sealed round is open, 409 `duplicate` for a name that is there already
   */
  async add(actor: Actor, caseId: string, input: NewCandidate): Promise<Candidate> {
    return this.work.run(async (work) => {
      const { file } = await this.access.open(actor, caseId, 'candidate.add', work.em);
      const rows = await work.em.findBy(CandidateRow, { caseId });
      refuseName(
        input.name,
        rows.filter((row) => row.retiredInSet === null),
      );
      const candidateSet = file.candidateSet + 1;
      const id = randomUUID();
      await work.em.insert(CandidateRow, {
        id,
        caseId,
        position: Math.max(-1, ...rows.map((known) => known.position)) + 1,
        name: input.name,
        detail: input.detail ?? '',
        mustNotMiss: input.mustNotMiss ?? false,
        addedInSet: candidateSet,
        retiredInSet: null,
        addedById: actor.id,
        addedAt: this.clock.now(),
      });
      const line = { actorId: actor.id, action: 'candidate.added', sentence: 'added a candidate' };
      await this.changes.commit(work, file, 'candidates', line, { candidateSet });
      const entry = (await this.candidates.inForce(caseId, work.em)).find((known) => known.id === id);
      if (!entry) throw notFound();
      return entry;
    });
  }

  /** @returns the next candidate set */
  async retire(actor: Actor, candidateId: string, words: string | undefined): Promise<CandidateSet> {
    const caseId = await this.caseOf(candidateId);
    return this.work.run(async (work) => {
      const { file } = await this.access.open(actor, caseId, 'candidate.retire', work.em);
      const candidateSet = file.candidateSet + 1;
      const change = {
        retiredInSet: candidateSet,
        retiredWords: words === undefined || words === '' ? null : words,
        retiredById: actor.id,
        retiredAt: this.clock.now(),
      };
      const where = { id: candidateId, caseId, retiredInSet: IsNull() };
      const { affected } = await work.em.update(CandidateRow, where, change);
      if (affected !== 1) throw new Refusal('wrong-state', 'This candidate has been retired already.');
      const line = { actorId: actor.id, action: 'candidate.retired', sentence: 'retired a candidate' };
      await this.changes.commit(work, file, 'candidates', line, { candidateSet });
      return { candidateSet, items: await this.candidates.inForce(caseId, work.em) };
    });
  }

  private async caseOf(candidateId: string, em: EntityManager = this.source.manager): Promise<string> {
    const row = await em.findOneBy(CandidateRow, { id: candidateId });
    if (!row) throw notFound();
    return row.caseId;
  }
}

function refuseName(name: string, inForce: readonly CandidateRow[]): void {
  if (isNoneOfThese(name)) {
    throw invalid([{ path: 'name', message: 'none of these is always there, as the last column' }]);
  }
  if (inForce.some((row) => sameName(row.name, name))) {
    throw new Refusal('duplicate', 'This candidate is on the differential already.', {
      fields: [{ path: 'name', message: 'is on the differential already' }],
    });
  }
  if (inForce.length >= most) {
    throw new Refusal(
      'wrong-state',
      `The differential holds ${String(most)} candidates, the most it can. Retire one before you add another.`,
    );
  }
}
