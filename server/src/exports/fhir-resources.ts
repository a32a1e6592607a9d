import type { Case, Sex } from '@weighhouse/shared/contracts/cases';
import type { Finding } from '@weighhouse/shared/contracts/findings';
import type { Plan } from '@weighhouse/shared/contracts/plans';
import { naturalFrequency } from '@weighhouse/shared/reasoning/natural-frequency';

/** A resource of HL7 FHIR R4 as far as the bundle needs its shape; https://hl7.org/fhir/R4/resourcelist.html. */
export interface FhirResource {
  resourceType: string;
  id: string;
  [element: string]: unknown;
}

interface Reference {
  reference: string;
}

const text = (words: string): { text: string } => ({ text: words });
const display = (name: string): { display: string } => ({ display: name });
const coded = (system: string, code: string) => ({ coding: [{ system, code }] });

/** The system of our case numbers. */
const caseNumbers = 'urn:weighhouse:case-number';

const genders: Record<Sex, string> = { female: 'female', male: 'male', other: 'other', unknown: 'unknown' };

/** The patient as the case shows them: a number and a sex. The identity card is never a part of an export. */
export function patient(id: string, file: Case): FhirResource {
  return {
    resourceType: 'Patient',
    id,
    identifier: [{ system: caseNumbers, value: file.number }],
    gender: genders[file.sex ?? 'unknown'],
  };
}

export function serviceRequest(file: Case, subject: Reference): FhirResource {
  const statuses: Partial<Record<Case['state'], string>> = {
    draft: 'draft',
    concluded: 'completed',
    outcomeKnown: 'completed',
    declined: 'revoked',
    withdrawn: 'revoked',
  };
  return {
    resourceType: 'ServiceRequest',
    id: file.id,
    identifier: [{ system: caseNumbers, value: file.number }],
    status: statuses[file.state] ?? 'active',
    intent: 'order',
    priority: file.urgency === 'withinWeek' ? 'urgent' : 'routine',
    code: text('Second opinion of a panel'),
    subject,
    ...(file.submittedAt === null ? {} : { authoredOn: file.submittedAt }),
    requester: display(file.referrer.name),
    reasonCode: [text(file.question)],
  };
}

/** The age; LOINC 30525-0, in years by UCUM. */
export function ageObservation(id: string, age: number, subject: Reference): FhirResource {
  return {
    resourceType: 'Observation',
    id,
    status: 'final',
    code: coded('http://loinc.org', '30525-0'),
    subject,
    valueQuantity: { value: age, unit: 'years', system: 'http://unitsofmeasure.org', code: 'a' },
  };
}

/** A finding that counts; a pending one has no value yet. */
export function findingObservation(finding: Finding, subject: Reference): FhirResource {
  const { observed, levelLabels, observedOn } = finding;
  return {
    resourceType: 'Observation',
    id: finding.id,
    status: observed === null ? 'registered' : 'final',
    code: text(finding.title),
    subject,
    ...(observedOn === null ? {} : { effectiveDateTime: observedOn }),
    ...(observed === null ? {} : { valueCodeableConcept: text(levelLabels[observed] ?? '') }),
  };
}

/** The working diagnosis, as certain as the plan says; the words of both are the same. */
export function condition(id: string, plan: Plan, subject: Reference): FhirResource {
  return {
    resourceType: 'Condition',
    id,
    clinicalStatus: coded('http://terminology.hl7.org/CodeSystem/condition-clinical', 'active'),
    verificationStatus: coded(
      'http://terminology.hl7.org/CodeSystem/condition-ver-status',
      plan.certainty ?? 'unconfirmed',
    ),
    code: text(plan.workingDiagnosis),
    subject,
    ...(plan.signedAt === null ? {} : { recordedDate: plan.signedAt }),
    note: [text(`Remaining doubt: ${plan.remainingDoubt}`)],
  };
}

export function carePlan(plan: Plan, subject: Reference, addresses: Reference): FhirResource {
  const dissent = plan.stances.filter(({ stance }) => stance === 'dissent');
  return {
    resourceType: 'CarePlan',
    id: plan.id,
    status: plan.actions.every(({ doneAt }) => doneAt !== null) ? 'completed' : 'active',
    intent: 'plan',
    title: `Plan ${String(plan.number)}`,
    subject,
    ...(plan.signedAt === null ? {} : { created: plan.signedAt }),
    ...(plan.signedBy === null ? {} : { author: display(plan.signedBy.name) }),
    addresses: [addresses],
    activity: plan.actions.map(({ what, owner, due, doneAt }) => ({
      detail: {
        status: doneAt === null ? 'not-started' : 'completed',
        description: what,
        ...(owner === null ? {} : { performer: [display(owner.name)] }),
        ...(due === null ? {} : { scheduledPeriod: { end: due } }),
      },
    })),
    note: [
      text(`Safety-net advice: ${plan.safetyNet}`),
      ...dissent.map(({ person, words }) => text(`Dissent of ${person.name}: ${words ?? ''}`)),
    ],
  };
}

/** Where the panel stands, in whole percent; never 0 and never 100. */
export function riskAssessment(
  id: string,
  standing: readonly { name: string; share: number }[],
  method: string,
  subject: Reference,
): FhirResource {
  return {
    resourceType: 'RiskAssessment',
    id,
    status: 'final',
    method: text(method),
    subject,
    prediction: standing.map(({ name, share }) => ({
      outcome: text(name),
      ...probability(share),
      rationale: `${naturalFrequency(share).words} patients like this one`,
    })),
  };
}

function probability(share: number): Record<string, unknown> {
  const { outOf100 } = naturalFrequency(share);
  const percent = (value: number) => ({ value, unit: '%', system: 'http://unitsofmeasure.org', code: '%' });
  if (outOf100 === 'under 1') return { probabilityRange: { high: percent(1) } };
  if (outOf100 === 'over 99') return { probabilityRange: { low: percent(99) } };
  return { probabilityDecimal: outOf100 };
}
