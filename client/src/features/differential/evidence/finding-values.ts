import {
  changeFindingSchema,
  type ChangeFinding,
  type Finding,
  type FindingKind,
  type NewFinding,
  newFindingSchema,
  reliabilityWords,
} from '@weighhouse/shared/contracts/findings';
import type { FieldFault } from '@weighhouse/shared/contracts/errors';
import type { z } from 'zod';
import { faultsIn } from '../../../components/faults';

export type ReliabilityWord = keyof typeof reliabilityWords;

/** A finding as its form holds it: everything as typed. */
export interface FindingValues {
  title: string;
  detail: string;
  kind: FindingKind | '';
  /** Levels of one's own, one a line; empty: absent and present. */
  ownLevels: boolean;
  levelLabels: string[];
  /** Index of the observed level as text; `pending`; empty while nothing is chosen. */
  observed: string;
  reliability: ReliabilityWord | '';
  groupId: string;
  observedOn: string;
  reportId: string;
  page: string;
  sourceText: string;
  cost: string;
  waitDays: string;
  burden: string;
}

export const emptyFinding: FindingValues = {
  title: '',
  detail: '',
  kind: '',
  ownLevels: false,
  levelLabels: ['', '', ''],
  observed: '',
  reliability: '',
  groupId: '',
  observedOn: '',
  reportId: '',
  page: '',
  sourceText: '',
  cost: '',
  waitDays: '',
  burden: '',
};

const plainLevels = ['absent', 'present'];
const text = (value: number | null) => (value === null ? '' : String(value));

export function valuesOf(finding: Finding): FindingValues {
  const ownLevels =
    finding.levelLabels.length > 2 ||
    finding.levelLabels.some((label, index) => label !== plainLevels[index]);
  const reliability = Object.entries(reliabilityWords).find(
    ([, share]) => Math.abs(share - finding.reliability) < 0.005,
  );
  return {
    title: finding.title,
    detail: finding.detail,
    kind: finding.kind,
    ownLevels,
    levelLabels: ownLevels ? [...finding.levelLabels] : ['', '', ''],
    observed: finding.observed === null ? 'pending' : String(finding.observed),
    reliability: (reliability?.[0] as ReliabilityWord | undefined) ?? '',
    groupId: finding.groupId ?? '',
    observedOn: finding.observedOn ?? '',
    reportId: finding.source?.reportId ?? '',
    page: text(finding.source?.page ?? null),
    sourceText: finding.source?.text ?? '',
    cost: text(finding.cost),
    waitDays: text(finding.waitDays),
    burden: text(finding.burden),
  };
}

type Body = z.input<typeof newFindingSchema>;

/** What is sent; a field that is not a number stays text, so that the contract names it. */
export function bodyOf(values: FindingValues): Record<keyof NewFinding, unknown> {
  const pending = values.observed === 'pending';
  const number = (typed: string) => {
    const trimmed = typed.trim().replace(',', '.');
    if (trimmed === '') return null;
    return Number.isFinite(Number(trimmed)) ? Number(trimmed) : trimmed;
  };
  const labels = values.levelLabels.map((label) => label.trim());
  const named = labels.filter((label) => label !== '');
  return {
    title: values.title,
    detail: values.detail,
    kind: values.kind === '' ? undefined : values.kind,
    levelLabels: values.ownLevels ? named : plainLevels,
    observed: pending
      ? null
      : values.ownLevels
        ? placeOf(number(values.observed), labels)
        : number(values.observed),
    reliability: values.reliability === '' ? undefined : values.reliability,
    groupId: values.groupId === '' ? null : values.groupId,
    observedOn: values.observedOn === '' ? null : values.observedOn,
    cost: pending ? number(values.cost) : null,
    waitDays: pending ? number(values.waitDays) : null,
    burden: pending ? number(values.burden) : null,
    source: sourceOf(values, number(values.page)),
  };
}

/** The place of a chosen level among those that have a name: a field left blank in between is no level. */
function placeOf(chosen: unknown, labels: readonly string[]): unknown {
  if (typeof chosen !== 'number') return chosen;
  if (labels[chosen] === '') return labels.length;
  return chosen - labels.slice(0, chosen).filter((label) => label === '').length;
}

function sourceOf({ reportId, sourceText }: FindingValues, page: unknown): unknown {
  const words = sourceText.trim();
  if (reportId === '' && words === '') return null;
  return {
    reportId: reportId === '' ? null : reportId,
    page: reportId === '' ? null : page,
    text: words === '' ? null : words,
  };
}

/** What the form asks for beyond the contract: nothing here has a preset, so everything that matters is chosen. */
export function faultsOf(values: FindingValues): FieldFault[] {
  const faults: FieldFault[] = [];
  if (values.kind === '') faults.push({ path: 'kind', message: 'choose where it comes from' });
  if (values.observed === '') faults.push({ path: 'observed', message: 'choose what is known' });
  if (values.reliability === '')
    faults.push({ path: 'reliability', message: 'choose how far the report can be trusted' });
  const body = bodyOf(values);
  const labels = Array.isArray(body.levelLabels) ? body.levelLabels.length : 2;
  if (values.ownLevels && typeof body.observed === 'number' && body.observed >= labels)
    faults.push({ path: 'observed', message: 'must be one of the levels' });
  const known = new Set(faults.map((fault) => fault.path));
  return [...faults, ...faultsIn(newFindingSchema, body).filter((fault) => !known.has(fault.path))];
}

export const newBody = (values: FindingValues): Body => newFindingSchema.parse(bodyOf(values));

export function changeBody(values: FindingValues, version: number): ChangeFinding {
  return changeFindingSchema.parse({ ...bodyOf(values), version });
}
