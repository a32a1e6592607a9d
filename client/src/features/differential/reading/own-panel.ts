import type { Differential, PanelView } from '@weighhouse/shared/contracts/differential';
import type { RowJudgement } from '@weighhouse/shared/contracts/judgements';

const blank: PanelView['contributors'] = [];

/**
 * A panel of one's own numbers alone, for a round in which the others' are sealed: nothing in it comes from anybody
 * else. It has no contributor where one has said nothing.
 * @param differential with a trial applied, if there is one
 * @param coexistence as the reading has it
 */
export function ownPanel(differential: Differential, coexistence: number): PanelView {
  const { candidates, settings, mine } = differential;
  const inForce = candidates.filter((candidate) => !candidate.retired).map(({ id }) => id);
  const groups = settings.groups.map(({ id, overlap }) => ({ id, overlap }));
  const findings = differential.findings.filter((finding) => !finding.enteredInError);
  const counted = new Set(findings.map(({ id }) => id));
  const rows = (mine?.findings ?? []).filter(
    (row) => counted.has(row.findingId) && row.outOf100.some((cell) => cell !== null),
  );
  const prior = mine?.prior && mine.priorInForce ? mine.prior.outOf100.map((share) => share / 100) : null;
  return {
    candidates: inForce,
    coexistence,
    tempering: settings.tempering,
    together: settings.together.flatMap(({ a, b, times }) => {
      const pair = { a: inForce.indexOf(a), b: inForce.indexOf(b), times };
      return pair.a >= 0 && pair.b >= 0 ? [pair] : [];
    }),
    groups,
    findings: findings.map((finding) => ({
      id: finding.id,
      levels: finding.levelLabels.length,
      observed: finding.observed,
      reliability: finding.reliability,
      ...(groups.some((group) => group.id === finding.groupId) && finding.groupId !== null
        ? { group: finding.groupId }
        : {}),
    })),
    contributors:
      mine && (prior !== null || rows.length > 0)
        ? [{ id: mine.key, weight: 1, prior, likelihoods: likelihoodsOf(rows) }]
        : blank,
  };
}

function likelihoodsOf(rows: readonly RowJudgement[]): PanelView['contributors'][number]['likelihoods'] {
  return Object.fromEntries(
    rows.map(({ findingId, exposure, outOf100 }) => [findingId, { exposure, given: outOf100.map(fraction) }]),
  );
}

function fraction(cell: RowJudgement['outOf100'][number]): number | number[] | null {
  if (cell === null) return null;
  return typeof cell === 'number' ? cell / 100 : cell.map((share) => share / 100);
}
