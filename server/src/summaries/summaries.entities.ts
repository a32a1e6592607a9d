import { ContactRow } from './contact.entity.js';
import { IdentityCardRow } from './identity-card.entity.js';
import { SummaryRow } from './summary.entity.js';

/** The tables of this domain. */
export const summariesEntities = [IdentityCardRow, SummaryRow, ContactRow];
