import { Injectable } from '@nestjs/common';
import type { CaseSubject } from '@weighhouse/shared/access/can';
import { describe } from '../cases/case-access.js';
import { CaseDirectory } from '../cases/case-directory.js';
import { TeamReader } from '../cases/team-reader.js';
import type { Actor } from '../platform/http/actor.js';

/** How everybody stands to one case at one moment. */
export interface Audience {
  revision: number;
  sealed: boolean;
  subjectFor(actor: Actor): CaseSubject;
}

/** Reads how people stand to a case: anew for every push, in two queries however many listen. */
@Injectable()
export class Audiences {
  constructor(
    private readonly cases: CaseDirectory,
    private readonly team: TeamReader,
  ) {}

  /** @returns null for an unknown case */
  async of(caseId: string): Promise<Audience | null> {
    const file = await this.cases.byId(caseId);
    if (!file) return null;
    const team = await this.team.current(caseId);
    const partsOf = (personId: string) =>
      team.filter((entry) => entry.personId === personId).map((entry) => entry.part);
    return {
      revision: file.revision,
      sealed: file.roundOpen && file.roundKind === 'sealed',
      subjectFor: (actor) => describe(actor, file, partsOf(actor.id)).subject,
    };
  }
}
