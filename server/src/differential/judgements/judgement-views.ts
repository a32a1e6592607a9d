import type { Finding } from '@weighhouse/shared/contracts/findings';
import type { PriorJudgement, RowJudgement } from '@weighhouse/shared/contracts/judgements';
import { columnsOf, priorInForce } from '../pool/panel-builder.js';
import { type Cell, isBlank, rowByColumns, scaled } from './judged-columns.js';
import { priorTarget, type SavedVersion } from './saved-version.js';

/** The columns and rows that judgements are shown over. */
export interface Ledger {
  candidateSet: number;
  candidates: readonly { id: string }[];
  findings: readonly Pick<Finding, 'id' | 'levelLabels'>[];
}

/** A person's judgement as the contract has it, out of 100. */
export interface JudgementView {
  prior: PriorJudgement | null;
  priorInForce: boolean;
  findings: RowJudgement[];
}

/** One person's judgements over the columns in force. A prior keeps the columns that it was given over. */
export function judgementView(ledger: Ledger, judgements: ReadonlyMap<string, SavedVersion>): JudgementView {
  const prior = judgements.get(priorTarget);
  const columns = columnsOf(ledger.candidates.map((candidate) => candidate.id));
  return {
    prior: prior ? priorView(prior) : null,
    priorInForce: priorInForce(prior, ledger.candidateSet),
    findings: ledger.findings.flatMap((finding) => {
      const saved = judgements.get(finding.id);
      return saved ? rowView(saved, rowByColumns(saved, columns, finding.levelLabels.length)) : [];
    }),
  };
}

function priorView(saved: SavedVersion): PriorJudgement {
  const { candidateSet, version, reason, savedAt } = saved;
  const outOf100 = saved.values.map((value) => value.thousandths / 10);
  return { candidateSet, version, outOf100, reason, savedAt: savedAt.toISOString() };
}

function rowView(saved: SavedVersion, cells: readonly Cell[]): RowJudgement[] {
  const { exposure, version, reason } = saved;
  if (exposure === null || isBlank(cells)) return [];
  const outOf100 = cells.map((cell) => scaled(cell, 10));
  const savedAt = saved.savedAt.toISOString();
  return [{ findingId: saved.target, version, exposure, outOf100, reason, savedAt }];
}
