import { randomUUID } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import type { FieldFault } from '@weighhouse/shared/contracts/errors';
import type { Outcome, OutcomeInput } from '@weighhouse/shared/contracts/outcomes';
import { DataSource, type EntityManager } from 'typeorm';
import { CandidatesService } from '../findings/candidates.service.js';
import { PeopleDirectory } from '../people/people-directory.js';
import { Clock } from '../platform/clock/clock.js';
import { OutcomeRow } from './outcome.entity.js';

/** The rows of outcomes, without a check of who asks. */
@Injectable()
export class OutcomeRegister {
  constructor(
    private readonly source: DataSource,
    private readonly clock: Clock,
    private readonly candidates: CandidatesService,
    private readonly people: PeopleDirectory,
  ) {}

  /** The outcome recorded last; null while it is not known. */
  async last(caseId: string, em: EntityManager = this.source.manager): Promise<Outcome | null> {
    const [row] = await em.find(OutcomeRow, { where: { caseId }, order: { recordedAt: 'DESC' }, take: 1 });
    if (!row) return null;
    const { candidateId, diagnosis, howKnown, knownOn, recordedById, recordedAt } = row;
    const recordedBy = (await this.people.byId(recordedById, em))?.name ?? '';
    return { candidateId, diagnosis, howKnown, knownOn, recordedBy, recordedAt: recordedAt.toISOString() };
  }

  async faults(em: EntityManager, caseId: string, input: OutcomeInput): Promise<FieldFault[]> {
    const faults: FieldFault[] = [];
    const known = await this.candidates.all(caseId, em);
    if (input.candidateId !== null && !known.some(({ id }) => id === input.candidateId))
      faults.push({
        path: 'candidateId',
        message: 'must be a candidate of this case, or null for none of these',
      });
    if (input.knownOn > this.clock.now().toISOString().slice(0, 10))
      faults.push({ path: 'knownOn', message: 'must not be in the future' });
    return faults;
  }

  async add(em: EntityManager, caseId: string, personId: string, input: OutcomeInput): Promise<void> {
    await em.insert(OutcomeRow, {
      id: randomUUID(),
      caseId,
      ...input,
      recordedById: personId,
      recordedAt: this.clock.now(),
    });
  }
}
