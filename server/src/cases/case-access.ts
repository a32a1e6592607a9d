import { Injectable } from '@nestjs/common';
import { abilitiesOf, can, type CaseSubject, type Verdict } from '@weighhouse/shared/access/can';
import type { CaseAction } from '@weighhouse/shared/access/actions';
import type { Part } from '@weighhouse/shared/contracts/cases';
import { DataSource, type EntityManager, IsNull } from 'typeorm';
import { notFound, Refusal, wrongPart } from '../platform/errors/refusal.js';
import type { Actor } from '../platform/http/actor.js';
import { CaseFile } from './case-file.entity.js';
import { TeamMember } from './team-member.entity.js';

/** A case that an actor has been let into, with what they are on it. */
export interface OpenedCase {
  file: CaseFile;
  parts: Part[];
  subject: CaseSubject;
  abilities: CaseAction[];
}

/** The first line of every service method about a case. */
@Injectable()
export class CaseAccess {
  constructor(private readonly source: DataSource) {}

  /**
   * Lets the actor in for one action.
   * @param em the running transaction; with it the case's row is locked until the end, so that moves do not race
   * @throws Refusal 404 to strangers, 403 in the wrong part, 409 at the wrong time
   */
  async open(actor: Actor, caseId: string, action: CaseAction, em?: EntityManager): Promise<OpenedCase> {
    const opened = await this.find(actor, caseId, em);
    if (!opened) throw notFound();
    const verdict = can(actor, action, opened.subject);
    if (verdict !== 'yes') throw refusalFor(verdict, opened.file, action);
    return opened;
  }

  private async find(actor: Actor, caseId: string, em?: EntityManager): Promise<OpenedCase | null> {
    const manager = em ?? this.source.manager;
    const file = await manager.findOne(CaseFile, {
      where: { id: caseId },
      ...(em ? { lock: { mode: 'pessimistic_write' as const } } : {}),
    });
    if (!file) return null;
    const rows = await manager.findBy(TeamMember, { caseId, personId: actor.id, leftAt: IsNull() });
    return describe(
      actor,
      file,
      rows.map((row) => row.part),
    );
  }
}

/** What an actor is on a case whose row and parts are already at hand. */
export function describe(actor: Pick<Actor, 'roles'>, file: CaseFile, parts: Part[]): OpenedCase {
  const openRound = file.roundOpen ? file.roundKind : null;
  const subject: CaseSubject = { state: file.state, parts, openRound };
  return { file, parts, subject, abilities: abilitiesOf(actor, subject) };
}

function refusalFor(verdict: Exclude<Verdict, 'yes'>, file: CaseFile, action: CaseAction): Refusal {
  switch (verdict) {
    case 'stranger':
      return notFound();
    case 'wrongPart':
      return wrongPart();
    case 'wrongState':
      return new Refusal('wrong-state', `The case is ${stateWords[file.state]}; this cannot be done now.`);
    case 'roundOpen':
      if (action.startsWith('candidate.')) return setFrozen();
      return new Refusal('round-open', 'A round is open. Unseal or close it first.');
    case 'roundNotOpen':
      return new Refusal('round-not-open', 'No round is open. The chair opens one.');
  }
}

const setFrozen = (): Refusal =>
  new Refusal('set-frozen', 'A sealed round is open: the candidates stay as they are until it is unsealed.');

const stateWords: Record<CaseFile['state'], string> = {
  draft: 'still a draft',
  submitted: 'submitted and waits for a chair',
  returned: 'returned to the referrer with a question',
  accepted: 'accepted and not yet being judged',
  judging: 'being judged',
  concluded: 'closed with a plan',
  outcomeKnown: 'closed, and its outcome is known',
  declined: 'declined',
  withdrawn: 'withdrawn',
};
