import type { SealedDocument } from '@weighhouse/shared/contracts/rounds';
import { isBlank, priorByColumns, rowByColumns } from '../judgements/judged-columns.js';
import { priorTarget, type SavedVersion } from '../judgements/saved-version.js';
import { columnsOf, priorInForce } from '../pool/panel-builder.js';

/** What somebody hands in: the last version of each target, over today's columns and rows. */
export interface HandedIn {
  caseId: string;
  roundId: string;
  personId: string;
  candidateSet: number;
  candidateIds: readonly string[];
  /** The findings that count, in the case's order. */
  findings: readonly { id: string; levelLabels: readonly string[] }[];
  judgements: ReadonlyMap<string, SavedVersion>;
}

/** The document that a seal closes over. Rows in the order of the findings, columns in that of the set, thousandths. */
export function sealedDocument(from: HandedIn): SealedDocument {
  const columns = columnsOf(from.candidateIds);
  const prior = from.judgements.get(priorTarget);
  const rows = from.findings.flatMap((finding) => {
    const saved = from.judgements.get(finding.id);
    if (!saved?.exposure) return [];
    const given = rowByColumns(saved, columns, finding.levelLabels.length);
    return isBlank(given) ? [] : [{ finding: finding.id, exposure: saved.exposure, given }];
  });
  return {
    caseId: from.caseId,
    roundId: from.roundId,
    personId: from.personId,
    candidateSet: from.candidateSet,
    findings: from.findings.map((finding) => finding.id),
    judgement: {
      prior: prior && priorInForce(prior, from.candidateSet) ? priorByColumns(prior, columns) : null,
      rows,
    },
  };
}
