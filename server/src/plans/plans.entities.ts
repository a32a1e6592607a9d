import { PlanActionRow } from './plan-action.entity.js';
import { PlanAsking } from './plan-asking.entity.js';
import { PlanStance } from './plan-stance.entity.js';
import { PlanRow } from './plan.entity.js';

/** The tables of this domain. */
export const plansEntities = [PlanRow, PlanActionRow, PlanAsking, PlanStance];
