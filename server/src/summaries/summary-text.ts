import type { Certainty, Plan } from '@weighhouse/shared/contracts/plans';
import { naturalFrequency } from '@weighhouse/shared/reasoning/natural-frequency';

/** Said at the end of every summary. */
export const summaryCaution =
  'This text comes from a discussion between doctors. It is not a diagnosis by itself and does not replace the advice of the people who treat you. In an emergency, do not wait: call the emergency number.';

/**
 * How sure the panel is, in a sentence for a patient. The certainties are those of HL7 FHIR R4 condition-ver-status;
 * the sentences are ours.
 */
const firstSentence: Record<Certainty, (diagnosis: string) => string[]> = {
  unconfirmed: (diagnosis) => [
    'The doctors do not know yet what causes your illness.',
    `They look into this first: ${diagnosis}.`,
  ],
  provisional: (diagnosis) => [
    `The best explanation so far is this: ${diagnosis}.`,
    'The doctors act on it now. They go on checking whether it is right.',
  ],
  differential: (diagnosis) => [
    `One possible explanation is this: ${diagnosis}.`,
    'There are others. The next steps help to tell them apart.',
  ],
  confirmed: (diagnosis) => [
    `The doctors are confident about the cause: ${diagnosis}.`,
    'There is enough evidence to treat you for it.',
  ],
};

/**
 * A first text for the patient, made from the signed plan: short sentences, everyday words around the plan's own, which
 * the liaison then puts into everyday words too.
 * @param share where the panel stood on the working diagnosis at signing (0 to 1); null where it is no candidate
 * @param dayInWords a calendar day as people read it
 * @returns paragraphs, separated by empty lines
 */
export function draftSummary(
  plan: Pick<Plan, 'workingDiagnosis' | 'certainty' | 'remainingDoubt' | 'safetyNet' | 'actions'>,
  share: number | null,
  dayInWords: (day: string) => string,
): string {
  const told = plan.actions.filter((action) => action.concernsPatient);
  const paragraphs = [
    'You have been ill for some time, and the cause was not clear. Several doctors have looked at your story and your results together. This is what they found.',
    [
      ...firstSentence[plan.certainty ?? 'unconfirmed'](withoutStop(plan.workingDiagnosis)),
      ...inPatients(share),
    ].join(' '),
    plan.remainingDoubt === '' ? '' : `What is not certain yet: ${sentence(plan.remainingDoubt)}`,
    told.length === 0
      ? ''
      : [
          'What happens next:',
          ...told.map(
            ({ what, due }) => `– ${withoutStop(what)}${due === null ? '' : `, by ${dayInWords(due)}`}.`,
          ),
        ].join('\n'),
    plan.safetyNet === '' ? '' : `When to get help at once: ${sentence(plan.safetyNet)}`,
    'Please ask about everything that is not clear. Your questions go back to the doctors.',
    summaryCaution,
  ];
  return paragraphs.filter((paragraph) => paragraph !== '').join('\n\n');
}

/** Counts of people are understood better than percentages; see natural-frequency.ts for the source. */
function inPatients(share: number | null): string[] {
  if (share === null) return [];
  const { outOf100 } = naturalFrequency(share);
  if (outOf100 === 'under 1')
    return ['Of 100 people with an illness like yours, fewer than 1 would have this.'];
  if (outOf100 === 'over 99')
    return ['Of 100 people with an illness like yours, nearly all would have this.'];
  return [
    `Think of 100 people with an illness like yours. About ${String(outOf100)} of them would have this. About ${String(100 - outOf100)} would have something else.`,
  ];
}

const withoutStop = (text: string): string => text.trim().replace(/[.\s]+$/, '');

const sentence = (text: string): string => (/[.!?]$/.test(text.trim()) ? text.trim() : `${text.trim()}.`);
