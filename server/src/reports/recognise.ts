import { reportKinds } from '@weighhouse/shared/contracts/reports';
import { fileTypeFromFile } from 'file-type';
import { Refusal } from '../platform/errors/refusal.js';
import { endingOf } from './file-name.js';
import { isPlainText } from './plain-text.js';

export type ReportKind = (typeof reportKinds)[number];

/** What browsers declare where they know nothing about a file; it claims nothing. */
const undeclared = 'application/octet-stream';
const way = 'Save it as PDF, JPEG, PNG or plain text and add it again.';

/**
 * What kind of report a file is. Its ending, the type declared with it and its content have to agree.
 * @throws Refusal 415 that names the file and the way out
 */
export async function recognise(path: string, fileName: string, declared: string): Promise<ReportKind> {
  const ending = endingOf(fileName);
  const named = reportKinds.find((kind) => kind.endings.some((known) => known === ending));
  if (!named) throw refused(`“${fileName}” is not named as a PDF, JPEG, PNG or plain text file. ${way}`);
  const found = await contentKind(path);
  if (!found) {
    const because = named.mediaType === 'text/plain' ? 'is not plain text in UTF-8' : `is no ${named.label}`;
    throw refused(`The content of “${fileName}” ${because}. ${way}`);
  }
  if (found !== named) {
    throw refused(
      `“${fileName}” is named as ${named.label}, but its content is ${found.label}. Give it the ending ${found.endings[0]} and add it again.`,
    );
  }
  if (declared !== undeclared && declared !== named.mediaType) {
    throw refused(`“${fileName}” is ${named.label}, but was sent as another kind of file. ${way}`);
  }
  return named;
}

async function contentKind(path: string): Promise<ReportKind | undefined> {
  const magic = await fileTypeFromFile(path);
  const binary = reportKinds.find((kind) => kind.mediaType === magic?.mime);
  if (binary) return binary;
  // Other signatures are not asked: "BM" begins a bitmap, and also a report on bone marrow.
  return (await isPlainText(path)) ? reportKinds.find((kind) => kind.mediaType === 'text/plain') : undefined;
}

const refused = (message: string): Refusal => new Refusal('wrong-type', message);
