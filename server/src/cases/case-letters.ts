import { Inject, Injectable } from '@nestjs/common';
import type { EntityManager } from 'typeorm';
import { PeopleDirectory } from '../people/people-directory.js';
import { type Configuration, CONFIGURATION } from '../platform/config/configuration.js';
import { Outbox } from '../platform/mail/outbox.js';
import type { CaseFile } from './case-file.entity.js';

type Named = Pick<CaseFile, 'id' | 'number'>;

/** Letters about a case: its number and a link, and nothing about the patient. */
@Injectable()
export class CaseLetters {
  constructor(
    private readonly outbox: Outbox,
    private readonly people: PeopleDirectory,
    @Inject(CONFIGURATION) private readonly configuration: Configuration,
  ) {}

  /** To contributors, when they are taken onto the team of an accepted case. */
  async askToJudge(em: EntityManager, file: Named, personIds: readonly string[]): Promise<void> {
    await this.send(em, file, personIds, `You are asked to judge case ${file.number}`);
  }

  /** To contributors, when a round is opened in which they judge. */
  async roundOpened(
    em: EntityManager,
    file: Named,
    round: { number: number },
    personIds: readonly string[],
  ): Promise<void> {
    await this.send(em, file, personIds, `Round ${String(round.number)} of case ${file.number} is open`);
  }

  /** To the referrer, when a chair has decided. */
  async tellReferrer(
    em: EntityManager,
    file: Named & Pick<CaseFile, 'referrerId'>,
    decision: 'accepted' | 'returned' | 'declined',
  ): Promise<void> {
    const subjects = {
      accepted: `Case ${file.number} has been accepted`,
      returned: `Case ${file.number} has been returned to you with a question`,
      declined: `Case ${file.number} has been declined`,
    };
    await this.send(em, file, [file.referrerId], subjects[decision]);
  }

  private async send(
    em: EntityManager,
    file: Named,
    personIds: readonly string[],
    subject: string,
  ): Promise<void> {
    const link = `${this.configuration.PUBLIC_URL}/cases/${file.id}`;
    const people = await this.people.byIds(personIds, em);
    for (const person of people.values()) {
      if (!person.active) continue;
      const body = `${person.name},\n\n${subject}.\n\n${link}\n\nSign in to see it. Letters say nothing about patients.\n`;
      await this.outbox.put(em, { to: person.email, subject, body });
    }
  }
}
