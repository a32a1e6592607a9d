import type { Other } from '@weighhouse/shared/contracts/differential';
import type { PriorJudgement, RowJudgement } from '@weighhouse/shared/contracts/judgements';
import type { PersonEntry } from '../../people/people-directory.js';
import { judgementView } from '../judgements/judgement-views.js';
import { type CasePool, keysOf, type PoolView, shownRound } from '../pool/case-pool.js';

/**
 * The numbers of the contributors that may be seen. Without names, nothing goes along by which a number could be
 * traced to its giver: no person, no specialty, no reason in their words, no moment at which they saved.
 * @param except whose numbers are not wanted, because they are the viewer's own
 */
export function othersOf(
  pool: CasePool,
  view: PoolView,
  people: ReadonlyMap<string, PersonEntry>,
  except: string | null,
): Other[] {
  const keys = keysOf(pool, view);
  const shownSince =
    (shownRound(pool)?.unsealedAt ?? shownRound(pool)?.openedAt ?? null)?.toISOString() ?? '';
  return pool.contributors
    .filter((one) => one.personId !== except && one.judgements.size > 0)
    .map(({ personId, weight, judgements }, index) => {
      const key = keys.get(personId) ?? '';
      const shown = judgementView(pool, judgements);
      if (view === 'named') {
        const person = people.get(personId);
        const name = person?.name ?? '';
        return { key, personId, name, specialty: person?.specialty ?? null, weight, ...shown };
      }
      return {
        key,
        personId: null,
        name: `Contributor ${key.slice(1) || String(index + 1)}`,
        specialty: null,
        weight,
        priorInForce: shown.priorInForce,
        prior: shown.prior && withoutTrace(shown.prior, shownSince),
        findings: shown.findings.map((row) => withoutTrace(row, shownSince)),
      };
    });
}

function withoutTrace<T extends PriorJudgement | RowJudgement>(judgement: T, savedAt: string): T {
  return { ...judgement, version: 0, reason: null, savedAt };
}
