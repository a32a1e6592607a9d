import type { Part } from '@weighhouse/shared/contracts/cases';
import type { PoolView } from '../pool/case-pool.js';

/** Contributors and the chair see whose numbers they are; the referrer sees them without names. */
export const viewOf = (parts: readonly Part[]): PoolView =>
  parts.includes('contributor') || parts.includes('chair') ? 'named' : 'anonymous';
