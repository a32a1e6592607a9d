import type { Differential } from '@weighhouse/shared/contracts/differential';
import type { Finding } from '@weighhouse/shared/contracts/findings';
import { capital, listed, numberWord } from '../../../lib/words';
import { alikeness, clusters, isNotable, nearlySame, sameWay } from './alike';

/** Findings that may count twice, because they stand ungrouped. */
export interface Warning {
  /** The same findings for the same reason are the same warning. */
  key: string;
  kind: 'report' | 'reportAndWay' | 'beams';
  findings: Finding[];
  fileName: string | null;
  /** The group that some of them are in already. */
  groupId: string | null;
}

/**
 * Which ungrouped findings may count twice: those of one report that push the same way, and those with nearly the same
 * beams. While a round is sealed, or where nothing is pooled, only the reports are looked at: nothing is drawn from
 * anybody's numbers.
 */
export function warningsOf({ findings, assessment, sealed }: Differential): Warning[] {
  const observed = findings.filter((finding) => finding.observed !== null && !finding.enteredInError);
  const beams = sealed || !assessment ? null : assessment.rows;
  const beamsOf = ({ id }: Finding) => beams?.[id]?.weightOfEvidence ?? [];
  const alike = (least: number) => (one: Finding, other: Finding) =>
    isNotable(beamsOf(one)) && isNotable(beamsOf(other)) && alikeness(beamsOf(one), beamsOf(other)) >= least;
  const sameReport = (one: Finding, other: Finding) =>
    one.source?.reportId != null && one.source.reportId === other.source?.reportId;

  const pushesSameWay = alike(sameWay);
  const fromReports = clusters(
    observed,
    (one, other) => sameReport(one, other) && (!beams || pushesSameWay(one, other)),
  ).map((cluster) => warningOf(beams ? 'reportAndWay' : 'report', cluster));
  const said = (cluster: readonly Finding[]) =>
    fromReports.some((warning) => cluster.every((finding) => warning.findings.includes(finding)));
  const fromBeams = (beams ? clusters(observed, alike(nearlySame)) : [])
    .filter((cluster) => !said(cluster))
    .map((cluster) => warningOf('beams', cluster));
  return [...fromReports, ...fromBeams].filter(isOpen);
}

function warningOf(kind: Warning['kind'], findings: Finding[]): Warning {
  const ids = findings.map(({ id }) => id).toSorted();
  return {
    key: `${kind === 'beams' ? 'beams' : 'report'} ${ids.join(' ')}`,
    kind,
    findings,
    fileName: findings[0]?.source?.fileName ?? null,
    groupId: findings.find((finding) => finding.groupId !== null)?.groupId ?? null,
  };
}

/** Somebody has thought about it where all are in groups, or where they are in more than one. */
function isOpen({ findings }: Warning): boolean {
  const groups = new Set(findings.flatMap(({ groupId }) => groupId ?? []));
  return groups.size < 2 && findings.some(({ groupId }) => groupId === null);
}

/** "These three come from one report and push the same way: do they count twice?" */
export function warningWords({ kind, findings, fileName }: Warning): string {
  const these = `These ${numberWord(findings.length)}`;
  const report = fileName === null ? 'one report' : `one report (${fileName})`;
  if (kind === 'beams') return `${these} have nearly the same beams: do they count twice?`;
  return kind === 'report'
    ? `${these} come from ${report}: if one mechanism explains them, do they count twice?`
    : `${these} come from ${report} and push the same way: do they count twice?`;
}

/** What a group made from a warning is called and why; the chair changes both where the groups are. */
export function groupFor({ kind, findings, fileName }: Warning): { label: string; reason: string } {
  const titles = listed(findings.map(({ title }) => title));
  return kind === 'beams'
    ? { label: short(titles), reason: 'Nearly the same beams.' }
    : {
        label: short(fileName === null ? capital(titles) : `From ${fileName}`),
        reason: kind === 'report' ? 'From one report.' : 'From one report, and they push the same way.',
      };
}

/** A group's name has at most 120 characters. */
const short = (text: string) => (text.length <= 120 ? text : `${text.slice(0, 119)}…`);
