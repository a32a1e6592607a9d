import { Injectable } from '@nestjs/common';
import type { Case, Part, TeamMember as TeamMemberView } from '@weighhouse/shared/contracts/cases';
import type { PersonRef } from '@weighhouse/shared/contracts/common';
import { PeopleDirectory, personRef } from '../people/people-directory.js';
import type { Actor } from '../platform/http/actor.js';
import { describe, type OpenedCase } from './case-access.js';
import { CaseFacts } from './case-facts.js';
import type { CaseFile } from './case-file.entity.js';
import { missingParts } from './missing-parts.js';
import { roundProgress } from './round-progress.js';
import { type TeamEntry, TeamReader } from './team-reader.js';

const nobody = (id: string): PersonRef => ({ id, name: '', specialty: '', centre: '' });

/** Cases as their team sees them. */
@Injectable()
export class CaseViews {
  constructor(
    private readonly team: TeamReader,
    private readonly people: PeopleDirectory,
    private readonly facts: CaseFacts,
  ) {}

  /** After a move the state has changed, so what the actor may do now is worked out anew. */
  async view(actor: Actor, opened: OpenedCase): Promise<Case> {
    const { file } = opened;
    const team = await this.team.current(file.id);
    const parts = team.filter((entry) => entry.personId === actor.id).map((entry) => entry.part);
    const people = await this.people.byIds([
      file.referrerId,
      ...team.map((entry) => entry.personId),
      ...(file.lastWordsById === null ? [] : [file.lastWordsById]),
    ]);
    const ref = (id: string): PersonRef => {
      const entry = people.get(id);
      return entry ? personRef(entry) : nobody(id);
    };
    const chair = team.find((entry) => entry.part === 'chair');
    return {
      ...columnsOf(file),
      referrer: ref(file.referrerId),
      chair: chair ? ref(chair.personId) : null,
      team: team.map((entry) => memberView(mayKnowWeights(parts) ? entry : unweighted(entry), ref)),
      round: roundProgress(file, team),
      counts: await this.facts.countsOf(file.id),
      words: wordsOf(file, (id) => ref(id).name),
      missing: ['draft', 'returned'].includes(file.state) ? missingParts(file) : [],
      parts,
      abilities: describe(actor, file, parts).abilities,
    };
  }

  /** The team, in the order of the parts. */
  async teamOf(caseId: string): Promise<TeamMemberView[]> {
    const team = await this.team.current(caseId);
    const people = await this.people.byIds(team.map((entry) => entry.personId));
    return team.map((entry) =>
      memberView(entry, (id) => {
        const person = people.get(id);
        return person ? personRef(person) : nobody(id);
      }),
    );
  }
}

/** A weight with a name would tell the referrer whose the unnamed numbers of the panel are. */
const mayKnowWeights = (parts: readonly Part[]): boolean => parts.some((part) => part !== 'referrer');
const unweighted = (entry: TeamEntry): TeamEntry => ({ ...entry, weight: null, reason: null });

function memberView(entry: TeamEntry, ref: (id: string) => PersonRef): TeamMemberView {
  return {
    person: ref(entry.personId),
    part: entry.part satisfies Part,
    weight: entry.weight,
    reason: entry.reason,
  };
}

function wordsOf(file: CaseFile, nameOf: (id: string) => string): Case['words'] {
  if (file.lastMove === null || file.lastWordsAt === null) return null;
  return {
    move: file.lastMove,
    text: file.lastWords ?? '',
    by: file.lastWordsById === null ? '' : nameOf(file.lastWordsById),
    at: file.lastWordsAt.toISOString(),
  };
}

type FromColumns = Omit<
  Case,
  'referrer' | 'chair' | 'team' | 'round' | 'counts' | 'words' | 'missing' | 'parts' | 'abilities'
>;

function columnsOf(file: CaseFile): FromColumns {
  return {
    id: file.id,
    number: file.number,
    state: file.state,
    version: file.version,
    revision: file.revision,
    question: file.question,
    age: file.age,
    sex: file.sex,
    urgency: file.urgency,
    urgencyReason: file.urgencyReason,
    consent: consentOf(file),
    historyHtml: file.historyHtml,
    conferenceAt: file.conferenceAt?.toISOString() ?? null,
    quorum: file.quorum,
    tempering: file.tempering,
    coexistence: file.coexistence,
    submittedAt: file.submittedAt?.toISOString() ?? null,
    createdAt: file.createdAt.toISOString(),
    updatedAt: file.updatedAt.toISOString(),
  };
}

function consentOf(file: CaseFile): Case['consent'] {
  if (file.consentGiven === null || file.consentHow === null || file.consentGivenOn === null) return null;
  return { given: file.consentGiven, how: file.consentHow, givenOn: file.consentGivenOn };
}
