import { OutcomeRow } from './outcome.entity.js';

/** The tables of this domain. */
export const outcomesEntities = [OutcomeRow];
