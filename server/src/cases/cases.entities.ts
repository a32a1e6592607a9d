import { CaseCounter } from './case-counter.entity.js';
import { CaseFile } from './case-file.entity.js';
import { TeamMember } from './team-member.entity.js';

/** The tables of this domain. */
export const casesEntities = [CaseCounter, CaseFile, TeamMember];
