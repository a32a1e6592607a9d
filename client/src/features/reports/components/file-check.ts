import { reportKinds, reportMediaTypes, reportSizeLimit } from '@weighhouse/shared/contracts/reports';
import { isApiError } from '../../../lib/api-error';
import { errorLine, errorWords } from '../../../lib/error-words';
import { listed, sizeWords } from '../../../lib/words';

const labels = reportKinds.map((kind) => kind.label);
const endings = reportKinds.flatMap((kind) => [...kind.endings]);

/** "PDF, JPEG, PNG or plain text". */
export const kindsLine = listed(labels).replace(' and ', ' or ');
export const sizeLine = `${String(reportSizeLimit / 1024 / 1024)} MB`;

const tooLarge = (bytes: number) =>
  `This file has ${sizeWords(bytes)}; ${sizeLine} is the most. Export it smaller, or split it.`;
const wrongType = `This is not a ${kindsLine} file by its content. Print or export it as a PDF and upload that.`;

interface Named {
  name: string;
  type: string;
  size: number;
}

/**
 * What is plainly wrong with a file before it is sent, with the way out; null to send it. What is in it is checked by
 * the server alone.
 */
export function fileFault({ name, type, size }: Named): string | null {
  if (size === 0) return 'This file is empty. Check whether it was saved, and choose it again.';
  if (size > reportSizeLimit) return tooLarge(size);
  const known =
    (reportMediaTypes as readonly string[]).includes(type) ||
    endings.some((ending) => name.toLowerCase().endsWith(ending));
  return known ? null : wrongType;
}

/** Why an upload failed, with the way out, and whether sending the same file again can help. */
export function uploadFault(error: unknown, size: number): { fault: string; retry: boolean } {
  if (isApiError(error, 'too-large')) return { fault: tooLarge(size), retry: false };
  if (isApiError(error, 'offline'))
    return { fault: 'Not sent: offline or the server cannot be reached. Try again.', retry: true };
  return { fault: errorLine(error), retry: errorWords(error).retry };
}
