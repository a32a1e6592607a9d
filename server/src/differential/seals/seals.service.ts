import { Injectable } from '@nestjs/common';
import type { Seal, SealedDocument } from '@weighhouse/shared/contracts/rounds';
import { In } from 'typeorm';
import { CaseAccess } from '../../cases/case-access.js';
import { PeopleDirectory, personRef } from '../../people/people-directory.js';
import type { Actor } from '../../platform/http/actor.js';
import { Snapshots } from '../pool/snapshots.js';
import { isShown } from '../pool/visible-judgements.js';
import { HandInRow } from '../rounds/hand-in.entity.js';
import { RoundReader } from '../rounds/round-reader.js';

/** The seals of a case: digests to all who may see who is in, what proves them only when the round is unsealed. */
@Injectable()
export class SealsService {
  constructor(
    private readonly access: CaseAccess,
    private readonly snapshots: Snapshots,
    private readonly rounds: RoundReader,
    private readonly people: PeopleDirectory,
  ) {}

  /** By round, in the order in which they were made. Random bytes and documents go to contributors and the chair. */
  async list(actor: Actor, caseId: string): Promise<{ items: Seal[] }> {
    const { parts } = await this.access.open(actor, caseId, 'seal.read');
    const mayVerify = parts.includes('contributor') || parts.includes('chair');
    return this.snapshots.run(async (em) => {
      const rounds = await this.rounds.ofCase(caseId, em);
      const handIns = await this.rounds.handIns(rounds, em);
      const people = await this.people.byIds(
        handIns.map((handIn) => handIn.personId),
        em,
      );
      const open = mayVerify ? rounds.filter(isShown) : [];
      const proofs = await em.findBy(HandInRow, { roundId: In(open.map((round) => round.id)) });
      const items = rounds.flatMap((round) =>
        handIns
          .filter((handIn) => handIn.roundId === round.id)
          .flatMap(({ personId, handedInAt, digest }) => {
            const person = people.get(personId);
            const proof = proofs.find((row) => row.roundId === round.id && row.personId === personId);
            if (!person) return [];
            return {
              roundId: round.id,
              roundNumber: round.number,
              person: personRef(person),
              handedInAt: handedInAt.toISOString(),
              digest,
              random: proof?.random ?? null,
              document: proof ? (JSON.parse(proof.text) as SealedDocument) : null,
            };
          }),
      );
      return { items };
    });
  }
}
