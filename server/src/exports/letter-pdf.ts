import { notReady } from '../platform/errors/refusal.js';
import type { ExportFacts } from './export-facts.js';
import { momentWords, patientWords } from './export-words.js';
import { PdfPage } from './pdf-page.js';
import { writePlan, writeStanding } from './plan-part.js';

/**
 * The letter to the referrer: the question, the signed plan, and where the panel stood when it was signed.
 * @throws Refusal not-ready before a plan is signed
 */
export async function letterPdf({ file, plan, now, timeZone }: ExportFacts): Promise<Buffer> {
  if (!plan) throw notReady([{ path: 'plan', message: 'must be signed before there is a letter' }]);
  const page = new PdfPage(`Letter about case ${file.number}`, `Case ${file.number}.`, now);
  const { referrer } = file;
  page.paragraph(
    [referrer.name, referrer.specialty, referrer.centre].filter((line) => line !== '').join('\n'),
  );
  page.note(momentWords(now.toISOString(), timeZone));
  page.title(`Case ${file.number}: ${patientWords(file)}`);
  page.paragraph(`Dear ${referrer.name},`);
  page.paragraph('You asked:');
  page.paragraph(file.question);
  page.paragraph('The panel has discussed the case. This is what it agreed on, who does what, and by when.');
  writePlan(page, plan, timeZone);
  writeStanding(page, plan);
  page.heading('With regards');
  page.paragraph(plan.signedBy === null ? 'The panel' : `${plan.signedBy.name}, for the panel`);
  return page.finish();
}
