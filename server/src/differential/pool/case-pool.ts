import type { Settings } from '@weighhouse/shared/contracts/cases';
import type { PanelView } from '@weighhouse/shared/contracts/differential';
import type { CandidateEntry } from '../../findings/candidates.service.js';
import type { FindingEntry } from '../../findings/findings.service.js';
import type { SavedVersion } from '../judgements/saved-version.js';
import type { HandInFact } from '../rounds/round-reader.js';
import type { RoundRow } from '../rounds/round.entity.js';
import { anonymousKeys } from './contributor-keys.js';
import { buildPanel, type PooledContributor } from './panel-builder.js';
import { isShown } from './visible-judgements.js';

/** A contributor now, with those of their judgements that may be seen. */
export interface VisibleContributor {
  personId: string;
  weight: number;
  judgements: ReadonlyMap<string, SavedVersion>;
}

/** Everything that a case's pool is made from, read at one moment. Only what may be seen is in it. */
export interface CasePool {
  caseId: string;
  revision: number;
  candidateSet: number;
  /** Those of the set in force, in the order of the columns. */
  candidates: readonly CandidateEntry[];
  /** All; those entered in error count nowhere. */
  findings: readonly FindingEntry[];
  settings: Settings;
  rounds: readonly RoundRow[];
  handIns: readonly HandInFact[];
  /** Every contributor of the team now, in an order that tells nothing. */
  contributors: readonly VisibleContributor[];
}

/** Whose eyes an assessment is for: those who may see whose numbers they are, or those who may not. */
export type PoolView = 'named' | 'anonymous';

/** The findings that count, in the case's order. */
export const countingFindings = (pool: Pick<CasePool, 'findings'>): FindingEntry[] =>
  pool.findings.filter((finding) => finding.enteredInError === null);

/** The key of each contributor in the assessment that a view gets. */
export function keysOf(pool: CasePool, view: PoolView): Map<string, string> {
  const ids = pool.contributors.map((one) => one.personId);
  return view === 'named' ? new Map(ids.map((id) => [id, id])) : anonymousKeys(ids);
}

/** The panel of what may be seen, as assess() takes it. */
export function panelOf(pool: CasePool, view: PoolView): PanelView {
  const keys = keysOf(pool, view);
  const contributors = pool.contributors.map((one) => ({
    key: keys.get(one.personId) ?? one.personId,
    weight: one.weight,
    judgements: one.judgements,
  }));
  return panelWith(pool, contributors);
}

/** The panel of one person alone, with everything that they saved: for that person's eyes. */
export function ownPanel(pool: CasePool, judgements: ReadonlyMap<string, SavedVersion>): PanelView {
  return panelWith(pool, [{ key: 'own', weight: 1, judgements }]);
}

function panelWith(pool: CasePool, contributors: readonly PooledContributor[]): PanelView {
  return buildPanel({
    candidateSet: pool.candidateSet,
    candidateIds: pool.candidates.map((candidate) => candidate.id),
    findings: countingFindings(pool),
    settings: pool.settings,
    contributors,
  });
}

/** The open round, or null. */
export const openRound = (pool: Pick<CasePool, 'rounds'>): RoundRow | null =>
  pool.rounds.find((round) => round.state === 'open') ?? null;

/** The last round whose numbers may be seen, or null. */
export const shownRound = (pool: Pick<CasePool, 'rounds'>): RoundRow | null =>
  pool.rounds.filter(isShown).at(-1) ?? null;

/** The contributors now who have said nothing in a round that is shown. */
export function notIn(pool: CasePool): string[] {
  const shown = new Set(pool.rounds.filter(isShown).map((round) => round.id));
  const handedIn = new Set(
    pool.handIns.filter((handIn) => shown.has(handIn.roundId)).map((handIn) => handIn.personId),
  );
  return pool.contributors
    .filter((one) => one.judgements.size === 0 && !handedIn.has(one.personId))
    .map((one) => one.personId);
}
