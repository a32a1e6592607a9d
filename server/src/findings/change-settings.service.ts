import { Injectable } from '@nestjs/common';
import type { ChangeSettings, Settings } from '@weighhouse/shared/contracts/cases';
import { CaseAccess } from '../cases/case-access.js';
import { CaseChanges } from '../cases/case-changes.js';
import { Clock } from '../platform/clock/clock.js';
import { UnitOfWork } from '../platform/database/unit-of-work.js';
import type { Actor } from '../platform/http/actor.js';
import { SettingsChange } from './settings-change.entity.js';
import { SettingsService } from './settings.service.js';
import { SettingsWriter } from './settings-writer.js';

const settingWords = {
  coexistence: 'whether candidates may coexist',
  tempering: 'the tempering',
  quorum: 'the quorum',
  conferenceAt: 'the date of the conference',
  groups: 'the groups of findings',
  together: 'which candidates go together',
} as const;

/** The chair changes how a case's numbers are read, with a reason that is kept. */
@Injectable()
export class ChangeSettingsService {
  constructor(
    private readonly access: CaseAccess,
    private readonly changes: CaseChanges,
    private readonly settings: SettingsService,
    private readonly writer: SettingsWriter,
    private readonly work: UnitOfWork,
    private readonly clock: Clock,
  ) {}

  /** What is left out stays as it is. A group that is left out of the list is dissolved. */
  async change(actor: Actor, caseId: string, { reason, ...asked }: ChangeSettings): Promise<Settings> {
    return this.work.run(async (work) => {
      const { file } = await this.access.open(actor, caseId, 'settings.change', work.em);
      await this.writer.write(work.em, caseId, asked);
      const columns = {
        coexistence: asked.coexistence ?? file.coexistence,
        tempering: asked.tempering ?? file.tempering,
        quorum: asked.quorum ?? file.quorum,
        conferenceAt: asked.conferenceAt === undefined ? file.conferenceAt : dateOf(asked.conferenceAt),
      };
      const line = { actorId: actor.id, action: 'settings.changed', sentence: sentenceOf(asked) };
      await this.changes.commit(work, file, 'settings', line, columns);
      await work.em.insert(SettingsChange, {
        caseId,
        changedById: actor.id,
        changedAt: this.clock.now(),
        ...columns,
        reason,
      });
      return this.settings.read(caseId, work.em);
    });
  }
}

const dateOf = (text: string | null): Date | null => (text === null ? null : new Date(text));

function sentenceOf(asked: Omit<ChangeSettings, 'reason'>): string {
  const named = Object.entries(settingWords)
    .filter(([key]) => asked[key as keyof typeof settingWords] !== undefined)
    .map(([, words]) => words);
  return named.length === 0 ? 'gave a reason for the settings' : `changed ${named.join(', ')}`;
}
