import { createWriteStream } from 'node:fs';
import { pipeline } from 'node:stream/promises';
import PDFDocument from 'pdfkit';
import type { DemoReport } from './demo-case.js';

const margin = 56;

/** Writes an imaging report as a PDF of one page, with its headings on lines of their own and no patient's name. */
export async function writeReportPdf(
  file: string,
  report: DemoReport,
  facts: { centre: string; day: string; network: string },
): Promise<void> {
  const document = new PDFDocument({
    size: 'A4',
    margin,
    info: { Title: report.title, Author: facts.centre },
  });
  const written = pipeline(document, createWriteStream(file));
  document.font('Helvetica').fontSize(9).fillColor('#555').text(facts.network);
  document.fontSize(11).text(facts.centre);
  document.moveDown().font('Helvetica-Bold').fontSize(16).fillColor('#000').text(report.title);
  document.moveDown(0.3).font('Helvetica').fontSize(10).text(`Date of examination: ${facts.day}`);
  for (const { heading, text } of sectionsOf(report.text)) {
    document.moveDown();
    if (heading) document.font('Helvetica-Bold').fontSize(10).text(heading);
    document.font('Helvetica').fontSize(11).text(text, { lineGap: 3 });
  }
  document.moveDown(2).fontSize(8).fillColor('#555');
  document.text('Invented for a demonstration. No real patient, clinician or hospital.');
  document.end();
  await written;
}

/** Splits "FINDINGS: … CONCLUSION: …" at its headings in capitals. */
export function sectionsOf(text: string): { heading: string | null; text: string }[] {
  return text
    .split(/(?=\b[A-Z]{5,}(?: [A-Z]{4,})*: )/)
    .map((part) => /^([A-Z]{5,}(?: [A-Z]{4,})*): (.*)$/s.exec(part.trim()) ?? [null, null, part.trim()])
    .map(([, heading, body]) => ({
      heading: heading ? sentenceCase(heading) : null,
      text: (body ?? '').trim(),
    }))
    .filter((section) => section.text !== '');
}

const sentenceCase = (words: string): string => words.charAt(0) + words.slice(1).toLowerCase();
