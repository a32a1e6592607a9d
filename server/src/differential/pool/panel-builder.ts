import type { Settings } from '@weighhouse/shared/contracts/cases';
import type { PanelView } from '@weighhouse/shared/contracts/differential';
import type { Finding } from '@weighhouse/shared/contracts/findings';
import { isBlank, priorByColumns, rowByColumns, scaled } from '../judgements/judged-columns.js';
import { priorTarget, type SavedVersion } from '../judgements/saved-version.js';

/** A contributor as the pool takes them: the versions that may be seen, the last of each target. */
export interface PooledContributor {
  key: string;
  weight: number;
  judgements: ReadonlyMap<string, SavedVersion>;
}

/** What a panel is made from. `findings` holds those that count, in the case's order. */
export interface PanelSource {
  candidateSet: number;
  candidateIds: readonly string[];
  findings: readonly Pick<
    Finding,
    'id' | 'levelLabels' | 'observed' | 'reliability' | 'groupId' | 'cost' | 'waitDays' | 'burden'
  >[];
  settings: Pick<Settings, 'coexistence' | 'tempering' | 'groups' | 'together'>;
  contributors: readonly PooledContributor[];
}

type PanelContributor = PanelView['contributors'][number];

/** The columns of a case: candidate ids in order, null for none of these. */
export const columnsOf = (candidateIds: readonly string[]): (string | null)[] => [...candidateIds, null];

/** Whether a prior was given over the candidate set in force; else it is asked again and not pooled. */
export const priorInForce = (prior: SavedVersion | undefined, candidateSet: number): boolean =>
  prior !== undefined && prior.candidateSet === candidateSet && prior.values.length > 0;

/**
 * The panel exactly as assess() takes it (the wire form of the method), read as the case says. Numbers are
 * fractions. Contributors of whom nothing may be pooled are left out.
 */
export function buildPanel(source: PanelSource): PanelView {
  const groups = source.settings.groups.map(({ id, overlap }) => ({ id, overlap }));
  const known = new Set(groups.map((group) => group.id));
  return {
    candidates: [...source.candidateIds],
    coexistence: source.settings.coexistence,
    tempering: source.settings.tempering,
    together: pairsOf(source),
    groups,
    findings: source.findings.map((finding) => ({
      id: finding.id,
      levels: finding.levelLabels.length,
      observed: finding.observed,
      reliability: finding.reliability,
      ...(finding.groupId !== null && known.has(finding.groupId) ? { group: finding.groupId } : {}),
      ...(finding.cost !== null ? { cost: finding.cost } : {}),
      ...(finding.waitDays !== null ? { waitDays: finding.waitDays } : {}),
      ...(finding.burden !== null ? { burden: finding.burden } : {}),
    })),
    contributors: source.contributors.map((one) => contributorOf(source, one)).filter(saysSomething),
  };
}

/** Whether there is anything to pool: candidates, and a contributor who counts. */
export const canBePooled = (panel: PanelView): boolean =>
  panel.candidates.length > 0 && panel.contributors.some((one) => one.weight > 0);

/** Pairs whose candidates are both in force, by column. */
function pairsOf({ settings, candidateIds }: PanelSource): PanelView['together'] {
  return settings.together.flatMap(({ a, b, times }) => {
    const pair = { a: candidateIds.indexOf(a), b: candidateIds.indexOf(b), times };
    return pair.a >= 0 && pair.b >= 0 ? [pair] : [];
  });
}

function contributorOf(
  source: PanelSource,
  { key, weight, judgements }: PooledContributor,
): PanelContributor {
  const columns = columnsOf(source.candidateIds);
  const prior = judgements.get(priorTarget);
  const inForce = prior && priorInForce(prior, source.candidateSet) ? priorByColumns(prior, columns) : null;
  const likelihoods = source.findings.flatMap((finding) => {
    const saved = judgements.get(finding.id);
    if (!saved?.exposure) return [];
    const cells = rowByColumns(saved, columns, finding.levelLabels.length);
    if (isBlank(cells)) return [];
    const given = cells.map((cell) => scaled(cell, 1000));
    return [[finding.id, { exposure: saved.exposure, given }] as const];
  });
  return {
    id: key,
    weight,
    prior: inForce?.map((share) => share / 1000) ?? null,
    likelihoods: Object.fromEntries(likelihoods),
  };
}

const saysSomething = (one: PanelContributor): boolean =>
  one.prior !== null || Object.keys(one.likelihoods).length > 0;
