import { CentreRow } from './centre.entity.js';
import { InvitationRow } from './invitation.entity.js';
import { PersonRole } from './person-role.entity.js';
import { PersonRow } from './person.entity.js';
import { SessionRow } from './session.entity.js';

/** The tables of this domain. */
export const peopleEntities = [CentreRow, PersonRow, PersonRole, InvitationRow, SessionRow];
