import {
  caseStates,
  type CaseQuery,
  type CaseState,
  urgencySchema,
} from '@weighhouse/shared/contracts/cases';
import { Brackets, type EntityManager, type SelectQueryBuilder } from 'typeorm';
import type { Actor } from '../platform/http/actor.js';
import { CaseFile } from './case-file.entity.js';

const open: CaseState[] = ['draft', 'submitted', 'returned', 'accepted', 'judging'];
const closed: CaseState[] = ['concluded', 'outcomeKnown', 'declined', 'withdrawn'];

const onTeam = `EXISTS (SELECT 1 FROM team_member m WHERE m.caseId = c.id AND m.personId = :me
  AND m.leftAt IS NULL AND m.part IN ('referrer', 'contributor', 'chair'))`;

const inOrder = (column: string, values: readonly string[]): string =>
  `FIELD(${column}, ${values.map((value) => `'${value}'`).join(', ')})`;

/** What each column is sorted by, its missing values last: states as a case lives, urgency as it presses. */
const orders: Record<string, string> = {
  number: 'LEFT(c.number, 2) * 1000000 + SUBSTRING(c.number, 4)',
  question: "NULLIF(c.question, '')",
  state: inOrder('c.state', caseStates),
  urgency: `NULLIF(${inOrder('c.urgency', urgencySchema.options)}, 0)`,
  conferenceAt: 'c.conferenceAt',
  updatedAt: 'c.updatedAt',
};

/**
 * The query behind the table of cases: what the actor may open as referrer, contributor or chair, and every submitted
 * case for a chair. Drafts and withdrawn cases are their referrer's alone.
 */
export function caseSearch(
  em: EntityManager,
  actor: Pick<Actor, 'id' | 'roles'>,
  query: CaseQuery,
): SelectQueryBuilder<CaseFile> {
  const search = em
    .createQueryBuilder(CaseFile, 'c')
    .where(
      new Brackets((mine) => {
        mine.where(`(${onTeam} AND (c.state NOT IN ('draft', 'withdrawn') OR c.referrerId = :me))`);
        if (actor.roles.includes('chair')) mine.orWhere("c.state = 'submitted'");
      }),
    )
    .setParameter('me', actor.id);
  const states = query.state === 'open' ? open : query.state === 'closed' ? closed : query.state;
  if (states !== undefined) search.andWhere('c.state IN (:...states)', { states: [states].flat() });
  const words = query.q?.trim() ?? '';
  if (words !== '') {
    search.andWhere('(c.number LIKE :like OR c.question LIKE :like)', { like: `%${plainLike(words)}%` });
  }
  return sorted(search, query.sort)
    .limit(query.size)
    .offset((query.page - 1) * query.size);
}

function sorted(search: SelectQueryBuilder<CaseFile>, sort: string): SelectQueryBuilder<CaseFile> {
  const descending = sort.startsWith('-');
  const expression = orders[descending ? sort.slice(1) : sort] ?? 'c.updatedAt';
  return (
    search
      .addSelect(`(${expression}) IS NULL`, 'sort_missing')
      // In brackets, or a plain column would be read as renamed and missing from the row.
      .addSelect(`(${expression})`, 'sort_key')
      .orderBy('sort_missing', 'ASC')
      .addOrderBy('sort_key', descending ? 'DESC' : 'ASC')
      .addOrderBy('c.id', 'ASC')
  );
}

/** Percent, underscore and backslash mean themselves in what people search for. */
export const plainLike = (words: string): string => words.replace(/[\\%_]/g, (sign) => `\\${sign}`);
