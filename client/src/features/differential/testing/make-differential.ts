import type { AssessmentView } from '@weighhouse/shared/contracts/assessment';
import type { Differential, Mine, Other } from '@weighhouse/shared/contracts/differential';
import type { Candidate, Finding } from '@weighhouse/shared/contracts/findings';
import type { RowJudgement } from '@weighhouse/shared/contracts/judgements';

/** Small invented pieces of a differential for the specs; each test says only what it is about. */
export function makeFinding(parts: Partial<Finding> = {}): Finding {
  return {
    id: 'f1',
    version: 1,
    title: 'Fever',
    detail: '',
    kind: 'symptom',
    levelLabels: ['absent', 'present'],
    observed: 1,
    reliability: 1,
    groupId: null,
    observedOn: null,
    cost: null,
    waitDays: null,
    burden: null,
    source: null,
    enteredInError: null,
    addedBy: 'Dr A',
    addedAt: '2026-12-01T09:00:00.000Z',
    ...parts,
  };
}

export function makeCandidate(id: string, parts: Partial<Candidate> = {}): Candidate {
  return {
    id,
    name: id,
    detail: '',
    mustNotMiss: false,
    addedBy: 'Dr A',
    retired: false,
    retiredWords: null,
    ...parts,
  };
}

export function makeRow(findingId: string, outOf100: RowJudgement['outOf100']): RowJudgement {
  return {
    findingId,
    version: 1,
    exposure: 'often',
    outOf100,
    reason: null,
    savedAt: '2026-12-01T09:00:00.000Z',
  };
}

export function makeMine(parts: Partial<Mine> = {}): Mine {
  return {
    key: 'me',
    version: 1,
    prior: null,
    priorInForce: false,
    findings: [],
    drafts: [],
    handedInAt: null,
    digest: null,
    standing: null,
    ...parts,
  };
}

export function makeOther(key: string, parts: Partial<Other> = {}): Other {
  return {
    key,
    personId: key,
    name: `Dr ${key}`,
    specialty: null,
    weight: 1,
    prior: null,
    priorInForce: false,
    findings: [],
    ...parts,
  };
}

export function makeAssessment(parts: Partial<AssessmentView> = {}): AssessmentView {
  return {
    method: 'weighhouse/1',
    exact: true,
    leftOut: 0,
    priorGiven: true,
    pooledPrior: [0.2, 0.8],
    pooledCells: {},
    unjudged: [],
    standing: [0.2, 0.8],
    sets: [],
    explains: [],
    own: {},
    linearPool: [0.2, 0.8],
    disagreementBits: 0,
    rows: {},
    nextTests: [],
    without: { contributors: {}, findings: {} },
    range: [
      { low: 0.1, high: 0.3 },
      { low: 0.7, high: 0.9 },
    ],
    ...parts,
  };
}

export function makeDifferential(parts: Partial<Differential> = {}): Differential {
  return {
    caseId: 'case',
    revision: 1,
    candidateSet: 1,
    candidates: [makeCandidate('still')],
    findings: [makeFinding()],
    settings: {
      coexistence: 0,
      tempering: 0.6,
      quorum: 3,
      conferenceAt: null,
      groups: [],
      together: [],
      lastChange: null,
    },
    round: null,
    sealed: false,
    shownRound: null,
    mine: null,
    assessment: null,
    before: null,
    others: null,
    agenda: [],
    abilities: [],
    ...parts,
  };
}
