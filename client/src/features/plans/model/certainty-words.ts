import type { Certainty } from '@weighhouse/shared/contracts/plans';

/**
 * What each certainty means, in plain words. The words themselves are those of HL7 FHIR R4,
 * condition-ver-status (https://hl7.org/fhir/R4/valueset-condition-ver-status.html).
 */
export const certaintyWords: Record<Certainty, { name: string; meaning: string }> = {
  unconfirmed: {
    name: 'Unconfirmed',
    meaning: 'There is not enough evidence yet to treat the patient as having it.',
  },
  provisional: {
    name: 'Provisional',
    meaning: 'The best explanation so far. It is acted on and still being tested.',
  },
  differential: {
    name: 'Differential',
    meaning: 'One of several possible diagnoses. It guides what is looked for next.',
  },
  confirmed: {
    name: 'Confirmed',
    meaning: 'There is enough evidence to treat the patient as having it.',
  },
};
