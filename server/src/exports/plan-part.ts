import type { Plan } from '@weighhouse/shared/contracts/plans';
import { certaintyWords, dayWords, momentWords, shareWords } from './export-words.js';
import type { PdfPage } from './pdf-page.js';

/** Writes a signed plan: what was agreed, who does what by when, and who dissents. */
export function writePlan(page: PdfPage, plan: Plan, timeZone: string): void {
  page.heading(`Plan ${String(plan.number)}`);
  if (plan.signedAt !== null && plan.signedBy !== null)
    page.note(`Signed by ${plan.signedBy.name} on ${momentWords(plan.signedAt, timeZone)}.`);
  page.labelled('Working diagnosis', plan.workingDiagnosis);
  if (plan.certainty !== null) page.labelled('Certainty', certaintyWords[plan.certainty]);
  page.labelled('Remaining doubt', plan.remainingDoubt);
  page.heading('Actions');
  for (const action of plan.actions) page.item(actionWords(action, timeZone));
  page.heading('Safety-net advice');
  page.paragraph(plan.safetyNet);
  page.heading('What the contributors said');
  for (const { person, stance, words } of plan.stances) {
    const name = person.specialty === '' ? person.name : `${person.name}, ${person.specialty}`;
    page.item(`${name}: ${stanceWords(stance, words)}`);
  }
}

/** Where the panel stood at signing. */
export function writeStanding(page: PdfPage, plan: Plan): void {
  if (plan.standing === null) return;
  page.heading('Where the panel stood at signing');
  for (const { name, share } of plan.standing) page.beam(name, shareWords(share), share);
  if (plan.method !== null) page.note(`Method: ${plan.method}. Of 100 patients like this one.`);
}

function actionWords(
  { what, owner, due, doneAt, doneWords }: Plan['actions'][number],
  timeZone: string,
): string {
  const who = owner === null ? '' : ` ${owner.name}`;
  const when = due === null ? '' : `, by ${dayWords(due)}`;
  const done = doneAt === null ? '' : ` Done on ${momentWords(doneAt, timeZone)}: ${doneWords ?? ''}`;
  return `${what}.${who}${when}.${done}`;
}

function stanceWords(stance: 'agree' | 'dissent' | null, words: string | null): string {
  if (stance === 'agree') return 'agrees';
  return stance === 'dissent' ? `dissents: ${words ?? ''}` : 'was asked and has not answered';
}
