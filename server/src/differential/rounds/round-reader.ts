import { Injectable } from '@nestjs/common';
import { DataSource, type EntityManager, In } from 'typeorm';
import { isShown } from '../pool/visible-judgements.js';
import { HandInRow } from './hand-in.entity.js';
import { RoundAbsence } from './round-absence.entity.js';
import { RoundRow } from './round.entity.js';

/** A hand-in without what is secret about it. */
export type HandInFact = Pick<HandInRow, 'roundId' | 'personId' | 'handedInAt' | 'version' | 'digest'>;

/** Rounds and hand-ins, without a check of who asks. */
@Injectable()
export class RoundReader {
  constructor(private readonly source: DataSource) {}

  async byId(roundId: string, em: EntityManager = this.source.manager): Promise<RoundRow | null> {
    return em.findOneBy(RoundRow, { id: roundId });
  }

  /** The rounds of a case, first to last. */
  async ofCase(caseId: string, em: EntityManager = this.source.manager): Promise<RoundRow[]> {
    return em.find(RoundRow, { where: { caseId }, order: { number: 'ASC' } });
  }

  /** The open round of a case; there is at most one. */
  async openOf(caseId: string, em: EntityManager = this.source.manager): Promise<RoundRow | null> {
    return em.findOneBy(RoundRow, { caseId, state: 'open' });
  }

  /** Who handed in and when, in the order in which it was done. The secrets of the seals are not read. */
  async handIns(
    rounds: readonly { id: string }[],
    em: EntityManager = this.source.manager,
  ): Promise<HandInFact[]> {
    if (rounds.length === 0) return [];
    return em.find(HandInRow, {
      select: { roundId: true, personId: true, handedInAt: true, version: true, digest: true },
      where: { roundId: In(rounds.map((round) => round.id)) },
      order: { handedInAt: 'ASC', personId: 'ASC' },
    });
  }

  /** Who had not handed in when a round ended. */
  async absences(
    rounds: readonly { id: string }[],
    em: EntityManager = this.source.manager,
  ): Promise<RoundAbsence[]> {
    if (rounds.length === 0) return [];
    return em.findBy(RoundAbsence, { roundId: In(rounds.map((round) => round.id)) });
  }

  /**
   * The rounds of a case whose numbers are still nobody's but their giver's. The trail leaves out what was done in
   * them, except to the person who did it.
   */
  async stillSealed(caseId: string, em?: EntityManager): Promise<string[]> {
    return (await this.ofCase(caseId, em)).filter((round) => !isShown(round)).map((round) => round.id);
  }
}
