import { Injectable } from '@nestjs/common';
import type { CaseAction } from '@weighhouse/shared/access/actions';
import type { Case, CaseState, WordedMove } from '@weighhouse/shared/contracts/cases';
import { Clock } from '../platform/clock/clock.js';
import { UnitOfWork } from '../platform/database/unit-of-work.js';
import type { Actor } from '../platform/http/actor.js';
import { CaseAccess } from './case-access.js';
import { CaseChanges } from './case-changes.js';
import { CaseLetters } from './case-letters.js';
import { CaseViews } from './case-views.js';
import { wordsColumns } from './case-words.js';

interface Move {
  action: CaseAction;
  to: CaseState;
  words: WordedMove;
  trail: string;
  sentence: string;
}

const moves = {
  return: {
    action: 'case.return',
    to: 'returned',
    words: 'returned',
    trail: 'case.returned',
    sentence: 'returned the case with a question',
  },
  decline: {
    action: 'case.decline',
    to: 'declined',
    words: 'declined',
    trail: 'case.declined',
    sentence: 'declined the case',
  },
  reopen: {
    action: 'case.reopen',
    to: 'judging',
    words: 'reopened',
    trail: 'case.reopened',
    sentence: 'reopened the case',
  },
} as const satisfies Record<string, Move>;

/** The moves for which a chair owes words. Reopening leads back to judging; the chair then opens a round. */
@Injectable()
export class ChairMoves {
  constructor(
    private readonly access: CaseAccess,
    private readonly changes: CaseChanges,
    private readonly views: CaseViews,
    private readonly letters: CaseLetters,
    private readonly work: UnitOfWork,
    private readonly clock: Clock,
  ) {}

  async make(actor: Actor, caseId: string, which: keyof typeof moves, words: string): Promise<Case> {
    const move = moves[which];
    const opened = await this.work.run(async (work) => {
      const found = await this.access.open(actor, caseId, move.action, work.em);
      await this.changes.commit(
        work,
        found.file,
        'case',
        { actorId: actor.id, action: move.trail, sentence: move.sentence },
        { state: move.to, ...wordsColumns(move.words, words, actor.id, this.clock.now()) },
      );
      if (move.to !== 'judging') await this.letters.tellReferrer(work.em, found.file, move.to);
      return found;
    });
    return this.views.view(actor, opened);
  }
}
