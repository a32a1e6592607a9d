import { Inject, Injectable } from '@nestjs/common';
import type { EntityManager } from 'typeorm';
import { PeopleDirectory } from '../people/people-directory.js';
import { type Configuration, CONFIGURATION } from '../platform/config/configuration.js';
import { Outbox } from '../platform/mail/outbox.js';

/** A letter about a case, without anything that is about the patient. */
export interface CaseLetter {
  /** What is so, as a sentence without its end; names the case by its number alone. */
  says: string;
  /** The path of the application that the link opens. */
  page: string;
}

/** Letters about a case's plan and summary. */
@Injectable()
export class PlanLetters {
  constructor(
    private readonly outbox: Outbox,
    private readonly people: PeopleDirectory,
    @Inject(CONFIGURATION) private readonly configuration: Configuration,
  ) {}

  /** @param personIds may repeat; deactivated people get nothing */
  async send(em: EntityManager, personIds: readonly string[], letter: CaseLetter): Promise<void> {
    const link = `${this.configuration.PUBLIC_URL}${letter.page}`;
    for (const person of (await this.people.byIds(personIds, em)).values()) {
      if (!person.active) continue;
      const body = [
        `${person.name},`,
        `${letter.says}.`,
        link,
        'Sign in to see it. Letters say nothing about patients.',
      ];
      await this.outbox.put(em, { to: person.email, subject: letter.says, body: `${body.join('\n\n')}\n` });
    }
  }
}
