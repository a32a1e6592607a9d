import { randomUUID } from 'node:crypto';
import { caution } from './caution.js';
import type { ExportFacts } from './export-facts.js';
import {
  ageObservation,
  carePlan,
  condition,
  type FhirResource,
  findingObservation,
  patient,
  riskAssessment,
  serviceRequest,
} from './fhir-resources.js';

/** A document of HL7 FHIR R4; https://hl7.org/fhir/R4/documents.html. */
export interface FhirBundle {
  resourceType: 'Bundle';
  type: 'document';
  identifier: { system: string; value: string };
  timestamp: string;
  entry: { fullUrl: string; resource: FhirResource }[];
}

interface Section {
  title: string;
  resources: FhirResource[];
}

const url = (id: string): string => `urn:uuid:${id}`;
const refer = (resource: FhirResource): { reference: string } => ({ reference: url(resource.id) });

/**
 * The case for another system: question, findings, plan, and where the panel stood, as far as the reader may see it.
 * Pseudonymous: the patient is a case number, an age and a sex.
 */
export function fhirBundle(facts: ExportFacts): FhirBundle {
  const subject = patient(randomUUID(), facts.file);
  const sections = sectionsOf(facts, refer(subject));
  const first = composition(facts, subject, sections);
  const resources = [first, subject, ...sections.flatMap((section) => section.resources)];
  return {
    resourceType: 'Bundle',
    type: 'document',
    identifier: { system: 'urn:ietf:rfc:3986', value: url(randomUUID()) },
    timestamp: facts.now.toISOString(),
    entry: resources.map((resource) => ({ fullUrl: url(resource.id), resource })),
  };
}

function sectionsOf(facts: ExportFacts, subject: { reference: string }): Section[] {
  const { file, differential, plan } = facts;
  const findings = differential.findings.filter((finding) => finding.enteredInError === null);
  const age = file.age === null ? [] : [ageObservation(randomUUID(), file.age, subject)];
  const sections: Section[] = [
    { title: 'Question', resources: [serviceRequest(file, subject)] },
    {
      title: 'Findings',
      resources: [...age, ...findings.map((finding) => findingObservation(finding, subject))],
    },
  ];
  const stood = standingOf(facts);
  if (stood) {
    const risk = riskAssessment(randomUUID(), stood.rows, stood.method, subject);
    sections.push({ title: 'Where the panel stands', resources: [risk] });
  }
  if (plan) {
    const working = condition(randomUUID(), plan, subject);
    sections.push({ title: 'Plan', resources: [working, carePlan(plan, subject, refer(working))] });
  }
  return sections.filter(({ resources }) => resources.length > 0);
}

/** As it was signed; without a plan as it stands, where that may be seen. */
function standingOf({ differential, plan }: ExportFacts): {
  rows: { name: string; share: number }[];
  method: string;
} | null {
  if (plan) return plan.standing && { rows: plan.standing, method: plan.method ?? '' };
  if (!differential.assessment) return null;
  const { standing, method } = differential.assessment;
  const names = [...differential.candidates.map((candidate) => candidate.name), 'none of these'];
  return { rows: names.map((name, column) => ({ name, share: standing[column] ?? 0 })), method };
}

function composition(
  { file, plan, now }: ExportFacts,
  subject: FhirResource,
  sections: Section[],
): FhirResource {
  return {
    resourceType: 'Composition',
    id: randomUUID(),
    status: plan ? 'final' : 'preliminary',
    // LOINC 11488-4: Consult note.
    type: { coding: [{ system: 'http://loinc.org', code: '11488-4' }], text: 'Consult note' },
    subject: refer(subject),
    date: now.toISOString(),
    author: [{ display: 'Panel of the case conference' }],
    title: `Case ${file.number}`,
    section: [
      {
        title: 'Caution',
        text: {
          status: 'generated',
          div: `<div xmlns="http://www.w3.org/1999/xhtml"><p>${caution}</p></div>`,
        },
      },
      ...sections.map(({ title, resources }) => ({ title, entry: resources.map(refer) })),
    ],
  };
}
