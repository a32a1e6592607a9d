import type { FindingKind } from '@weighhouse/shared/contracts/findings';
import type { Sex, Urgency } from '@weighhouse/shared/contracts/cases';
import type { Role } from '@weighhouse/shared/contracts/people';
import caseA from './case-a.json' with { type: 'json' };
import caseB from './case-b.json' with { type: 'json' };
import networkFile from './network.json' with { type: 'json' };

/** Invented people and centres of an invented network. */
export interface DemoNetwork {
  name: string;
  centres: { code: string; name: string }[];
  people: { id: string; name: string; role: Role; specialty: string; centre: string }[];
}

/** Numbers out of 100 for each candidate in order, none of these last. */
type Row = number[];

/** A pending test with what the contributors of its field say each result would be worth. */
export interface DemoTest {
  key: string;
  title: string;
  kind: FindingKind;
  detail: string;
  cost: number;
  waitDays: number;
  burden: number;
  levelLabels: string[];
  given: (number | number[])[];
  judgedBy: string[];
}

export interface DemoFinding {
  key: string;
  title: string;
  kind: FindingKind;
  on: string;
  reliability: 'firm' | 'fair' | 'doubtful';
  detail?: string;
  report?: string;
}

export interface DemoContributor {
  id: string;
  weight: number;
  weightReason: string | null;
  /** The findings of this person's own field, seen often; the others sometimes. */
  ownField: string[];
  prior: Row;
  reason: string;
  rows: Record<string, Row>;
  /** What the person changes in the live round. */
  later: { reason: string; rows: Record<string, Row> } | null;
}

export interface DemoReport {
  key: string;
  title: string;
  centre: string;
  on: string;
  text: string;
}

/** An invented case. Dates are those of the story; the calendar moves them to today. */
export interface DemoCase {
  key: string;
  conferenceTime: string;
  referrer: string;
  chair: string;
  liaison: string;
  receivedAt: string;
  question: string;
  age: number;
  sex: Sex;
  urgency: Urgency;
  urgencyReason: string;
  consent: { given: boolean; how: 'signed' | 'spoken'; givenOn: string };
  history: string[];
  tried: string;
  redFlags: string[];
  occupation: string;
  livesWith: string;
  wantsToKnow: string;
  medicines: string[];
  allergies: string[];
  timeline: { on: string; what: string }[];
  identity: { name: string; birthDate: string; telephone: string; language: string; howToReach: string };
  reports: DemoReport[];
  candidates: { key: string; name: string; detail: string; mustNotMiss: boolean }[];
  /** `discount` is the exponent that each of the members counts with. */
  groups: { key: string; label: string; reason: string; discount: number; members: string[] }[];
  findings: DemoFinding[];
  tests: DemoTest[];
  contributors: DemoContributor[];
}

// The files are ours and checked by the services when they are seeded; JSON has no types of its own.
export const network = networkFile as DemoNetwork;
export const demoCases = { a: caseA as unknown as DemoCase, b: caseB as unknown as DemoCase };
