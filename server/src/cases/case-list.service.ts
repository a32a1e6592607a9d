import { Injectable } from '@nestjs/common';
import type { CaseListItem, CaseQuery } from '@weighhouse/shared/contracts/cases';
import { DataSource } from 'typeorm';
import { PeopleDirectory } from '../people/people-directory.js';
import type { Actor } from '../platform/http/actor.js';
import type { CaseFile } from './case-file.entity.js';
import { caseSearch } from './case-search.js';
import { roundProgress } from './round-progress.js';
import { type TeamEntry, TeamReader } from './team-reader.js';

/** The cases that a person may open, a page at a time. */
@Injectable()
export class CaseListService {
  constructor(
    private readonly source: DataSource,
    private readonly team: TeamReader,
    private readonly people: PeopleDirectory,
  ) {}

  /** Only what the person may open is found; a part as liaison opens no case. */
  async list(actor: Actor, query: CaseQuery): Promise<{ items: CaseListItem[]; total: number }> {
    const [files, total] = await caseSearch(this.source.manager, actor, query).getManyAndCount();
    const teams = await this.team.currentOf(files.map((file) => file.id));
    const chairOf = (file: CaseFile): string | undefined =>
      teams.get(file.id)?.find((entry) => entry.part === 'chair')?.personId;
    const people = await this.people.byIds(
      files.flatMap((file) => [file.referrerId, chairOf(file) ?? file.referrerId]),
    );
    const items = files.map((file) => {
      const chairId = chairOf(file);
      return itemOf(file, teams.get(file.id) ?? [], {
        referrerName: people.get(file.referrerId)?.name ?? '',
        chairName: chairId === undefined ? null : (people.get(chairId)?.name ?? ''),
      });
    });
    return { items, total };
  }
}

function itemOf(
  file: CaseFile,
  team: readonly TeamEntry[],
  names: Pick<CaseListItem, 'referrerName' | 'chairName'>,
): CaseListItem {
  return {
    id: file.id,
    number: file.number,
    question: file.question,
    age: file.age,
    sex: file.sex,
    state: file.state,
    urgency: file.urgency,
    ...names,
    conferenceAt: file.conferenceAt?.toISOString() ?? null,
    round: roundProgress(file, team),
    ...standingOf(file),
    updatedAt: file.updatedAt.toISOString(),
  };
}

/** While a sealed round is open nobody is shown a leader, not even that of the round before. */
function standingOf(file: CaseFile): Pick<CaseListItem, 'leader' | 'disagreementBits'> {
  if (file.roundOpen && file.roundKind === 'sealed') return { leader: 'sealed', disagreementBits: 'sealed' };
  const { leaderName: name, leaderShare: share, disagreementBits } = file;
  return { leader: name === null || share === null ? null : { name, share }, disagreementBits };
}
