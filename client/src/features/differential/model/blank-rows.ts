import type { Mine } from '@weighhouse/shared/contracts/differential';
import type { Finding } from '@weighhouse/shared/contracts/findings';

/** What of one's own judgement is still blank before it is handed in. */
export interface Blanks {
  /** Rows without any number. */
  rows: Finding[];
  /** Rows with some numbers and some blanks. */
  partly: Finding[];
  judged: number;
  total: number;
  /** Less than half of the rows are judged: handing in needs the word that nothing more will come. */
  underHalf: boolean;
  priorMissing: boolean;
}

export function blanksOf(mine: Mine, findings: readonly Finding[]): Blanks {
  const inForce = findings.filter((finding) => !finding.enteredInError);
  const given = new Map(mine.findings.map((row) => [row.findingId, row.outOf100]));
  const filled = (finding: Finding) => (given.get(finding.id) ?? []).filter((cell) => cell !== null).length;
  const rows = inForce.filter((finding) => filled(finding) === 0);
  const judged = inForce.length - rows.length;
  return {
    rows,
    partly: inForce.filter(
      (finding) => filled(finding) > 0 && filled(finding) < (given.get(finding.id)?.length ?? 0),
    ),
    judged,
    total: inForce.length,
    underHalf: judged * 2 < inForce.length,
    priorMissing: mine.prior === null || !mine.priorInForce,
  };
}
