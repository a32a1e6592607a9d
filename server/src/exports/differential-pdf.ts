import type { Differential } from '@weighhouse/shared/contracts/differential';
import type { Finding } from '@weighhouse/shared/contracts/findings';
import { Refusal, sealedRefusal } from '../platform/errors/refusal.js';
import type { ExportFacts } from './export-facts.js';
import { dayWords, momentWords, patientWords, shareWords } from './export-words.js';
import { PdfPage } from './pdf-page.js';
import { writePlan } from './plan-part.js';

type Assessment = NonNullable<Differential['assessment']>;

/**
 * Differential and plan on A4, with the method, the weights and the caution.
 * @throws Refusal sealed while there are only sealed numbers; wrong-state before anybody has judged
 */
export async function differentialPdf(facts: ExportFacts): Promise<Buffer> {
  const { file, differential, plan, now, timeZone } = facts;
  const assessment = shown(differential);
  const printed = momentWords(now.toISOString(), timeZone);
  const page = new PdfPage(`Case ${file.number}`, `Case ${file.number}, ${printed}.`, now);
  page.title(`Case ${file.number}: differential and plan`);
  page.note(`${patientWords(file)}. Referred by ${file.referrer.name}, ${file.referrer.centre}.`);
  page.paragraph(file.question);
  writeDifferential(page, facts, assessment);
  writeFindings(page, differential);
  writeWeights(page, facts);
  if (plan) writePlan(page, plan, timeZone);
  return page.finish();
}

function shown(differential: Differential): Assessment {
  if (differential.assessment) return differential.assessment;
  if (differential.round) throw sealedRefusal();
  throw new Refusal('wrong-state', 'No round has been opened yet, so there are no numbers to show.');
}

function writeDifferential(
  page: PdfPage,
  { differential, now, timeZone }: ExportFacts,
  assessment: Assessment,
): void {
  page.heading('Where the panel stands');
  page.note(standsWhere(differential, momentWords(now.toISOString(), timeZone)));
  const names = [...differential.candidates.map((candidate) => candidate.name), 'none of these'];
  names.forEach((name, column) => {
    const share = assessment.standing[column] ?? 0;
    const mark = differential.candidates[column]?.mustNotMiss === true ? ' (must not be missed)' : '';
    page.beam(`${name}${mark}`, shareWords(share, assessment.range[column]), share);
  });
  const tempering = Math.round(differential.settings.tempering * 100);
  page.note(
    `Of 100 patients like this one. Method: ${assessment.method}. Every finding counts at ${String(tempering)} of 100 of its strength; the range shows other readings of the same numbers.`,
  );
}

function standsWhere({ shownRound, sealed }: Differential, today: string): string {
  if (!shownRound) return today;
  const round = `The numbers are those of round ${String(shownRound.number)}${shownRound.live ? ', which is live' : ''}, as of ${today}.`;
  const later = sealed ? ' A later round is sealed; nothing of it is here.' : '';
  const absent = shownRound.notIn.length > 0 ? ` Not in: ${shownRound.notIn.join(', ')}.` : '';
  return `${round}${later}${absent}`;
}

function writeFindings(page: PdfPage, { findings }: Differential): void {
  const counting = findings.filter((finding) => finding.enteredInError === null);
  page.heading('Findings');
  for (const finding of counting) page.item(findingWords(finding));
}

function findingWords({ title, observed, levelLabels, observedOn, reliability }: Finding): string {
  const state = observed === null ? 'pending' : (levelLabels[observed] ?? '');
  const day = observedOn === null ? '' : `, ${dayWords(observedOn)}`;
  const trust = reliability >= 1 ? '' : `, reliability ${String(Math.round(reliability * 100))} of 100`;
  return `${title}: ${state}${day}${trust}`;
}

function writeWeights(page: PdfPage, { file }: ExportFacts): void {
  // The referrer is not told who counts how much: with names it would say whose the unnamed numbers are.
  const weighed = file.team.some(({ weight }) => weight !== null);
  page.heading(weighed ? 'Who judged, and how much each counts' : 'Who judged');
  for (const { person, part, weight, reason } of file.team) {
    if (part !== 'contributor') continue;
    const why = reason === null || reason === '' ? '' : ` (${reason})`;
    const counts = weight === null ? '' : `: weight ${String(weight)}${why}`;
    page.item(`${person.name}, ${person.specialty}${counts}`);
  }
}
