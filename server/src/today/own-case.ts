import type { Part } from '@weighhouse/shared/contracts/cases';
import type { OpenedCase } from '../cases/case-access.js';

/** A case's row, as the cases hand it out. */
export type CaseFile = OpenedCase['file'];

/** A case on whose team the person is. */
export interface OwnCase {
  file: CaseFile;
  parts: Part[];
}

/** Whether the person may see what the case is about: a liaison may not. */
export const seesCase = ({ parts }: OwnCase): boolean => parts.some((part) => part !== 'liaison');

export const isSealed = (file: Pick<CaseFile, 'roundOpen' | 'roundKind'>): boolean =>
  file.roundOpen && file.roundKind === 'sealed';
