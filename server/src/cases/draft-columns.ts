import { randomUUID } from 'node:crypto';
import type { NewCase } from '@weighhouse/shared/contracts/cases';
import type { CaseFile } from './case-file.entity.js';
import { cleanHistory } from './history-html.js';

/** The columns that a draft's input sets; what the input leaves out stays as it is. */
export function draftColumns(input: NewCase): Partial<CaseFile> {
  const columns: Partial<CaseFile> = {};
  if (input.question !== undefined) columns.question = input.question;
  if (input.age !== undefined) columns.age = input.age;
  if (input.sex !== undefined) columns.sex = input.sex;
  if (input.urgency !== undefined) columns.urgency = input.urgency;
  if (input.urgencyReason !== undefined) columns.urgencyReason = input.urgencyReason;
  if (input.historyHtml !== undefined) columns.historyHtml = cleanHistory(input.historyHtml);
  if (input.consent !== undefined) {
    columns.consentGiven = input.consent?.given ?? null;
    columns.consentHow = input.consent?.how ?? null;
    columns.consentGivenOn = input.consent?.givenOn ?? null;
  }
  return columns;
}

/** A case on which nothing has been written yet. On a new case findings count at 60 of 100 of their strength. */
export function freshColumns(referrerId: string, now: Date): Omit<CaseFile, 'number'> {
  return {
    id: randomUUID(),
    state: 'draft',
    version: 1,
    revision: 0,
    referrerId,
    question: '',
    age: null,
    sex: null,
    urgency: null,
    urgencyReason: '',
    consentGiven: null,
    consentHow: null,
    consentGivenOn: null,
    historyHtml: '',
    conferenceAt: null,
    quorum: 3,
    tempering: 0.6,
    coexistence: 0,
    candidateSet: 0,
    roundNumber: null,
    roundKind: null,
    roundOpen: false,
    roundHandedIn: 0,
    leaderName: null,
    leaderShare: null,
    disagreementBits: null,
    lastMove: null,
    lastWords: null,
    lastWordsById: null,
    lastWordsAt: null,
    submittedAt: null,
    acceptedAt: null,
    concludedAt: null,
    createdAt: now,
    updatedAt: now,
  };
}
