import type { EntityManager } from 'typeorm';
import { CaseCounter } from './case-counter.entity.js';

/**
 * Takes the next number of a year. The year's row stays locked until the transaction ends, so numbers neither
 * repeat nor, when a transaction is rolled back, leave gaps.
 * @param year four digits
 */
export async function nextCaseNumber(em: EntityManager, year: number): Promise<string> {
  await em.query(
    'INSERT INTO case_counter (`year`, `last`) VALUES (?, 1) ON DUPLICATE KEY UPDATE `last` = `last` + 1',
    [year],
  );
  const { last } = await em.findOneByOrFail(CaseCounter, { year });
  return caseNumber(year, last);
}

/** Year and running number; more than four digits where a year has more than 9,999 cases. */
export function caseNumber(year: number, running: number): string {
  const two = String(year % 100).padStart(2, '0');
  return `${two}-${String(running).padStart(4, '0')}`;
}
