import { Injectable } from '@nestjs/common';
import type { Part } from '@weighhouse/shared/contracts/cases';
import type { EntityManager } from 'typeorm';
import { TeamReader } from '../cases/team-reader.js';
import { PlanLetters } from '../plans/plan-letters.js';

interface Named {
  id: string;
  number: string;
}

/** Letters between liaison and chair about a summary: a number and a link. */
@Injectable()
export class SummaryLetters {
  constructor(
    private readonly team: TeamReader,
    private readonly letters: PlanLetters,
  ) {}

  /** To the chair, when the text is handed in. */
  async askToApprove(em: EntityManager, file: Named): Promise<void> {
    const says = `The summary of case ${file.number} waits for your approval`;
    await this.send(em, file, 'chair', says, `/cases/${file.id}/summary`);
  }

  /** To the liaison, when the chair has decided. */
  async tellLiaison(em: EntityManager, file: Named, decision: 'approved' | 'returned'): Promise<void> {
    const says = {
      approved: `The summary of case ${file.number} is approved and can be told`,
      returned: `The summary of case ${file.number} has been returned to you with words`,
    };
    await this.send(em, file, 'liaison', says[decision], `/tell/${file.id}`);
  }

  private async send(em: EntityManager, file: Named, part: Part, says: string, page: string): Promise<void> {
    const team = await this.team.current(file.id, em);
    const personIds = team.filter((entry) => entry.part === part).map((entry) => entry.personId);
    await this.letters.send(em, personIds, { says, page });
  }
}
