import type { Settings } from '@weighhouse/shared/contracts/cases';
import { z } from 'zod';
import { isEmptyTrial, noTrial, trialSchema } from '../trial/trial';

/** How the numbers are read: candidates that exclude each other, or that one patient may have together. */
export const assumptions = ['one cause', 'may coexist'] as const;
export type Assumption = (typeof assumptions)[number];

/** What one person wants to see of the panel's numbers on this screen. */
export const wishSchema = z.object({
  /** Null: as the case has it. */
  assumption: z.enum(assumptions).nullable(),
  trial: trialSchema,
});
export type Wish = z.infer<typeof wishSchema>;

export const noWish: Wish = { assumption: null, trial: noTrial };

/** The share of patients with two or more of the candidates where the case says none (reasoning, section 3). */
export const usualCoexistence = 0.05;

type Coexisting = Pick<Settings, 'coexistence'>;

export const caseAssumption = ({ coexistence }: Coexisting): Assumption =>
  coexistence > 0 ? 'may coexist' : 'one cause';

/** The share that a wish reads the numbers with; 0 is one cause. */
export function wishedCoexistence({ assumption, trial }: Wish, settings: Coexisting): number {
  if (assumption === 'one cause') return 0;
  const said = trial.coexistence ?? settings.coexistence;
  if (assumption === null) return said;
  return said > 0 ? said : settings.coexistence > 0 ? settings.coexistence : usualCoexistence;
}

/** Whether the wish is nothing but the panel's own reading. */
export function isPanelsOwn(wish: Wish, settings: Coexisting): boolean {
  return isEmptyTrial(wish.trial) && wishedCoexistence(wish, settings) === settings.coexistence;
}

/** Chooses an assumption; the case's own is no wish of one's own. */
export function assumed(wish: Wish, assumption: Assumption, settings: Coexisting): Wish {
  const tried = wish.trial.coexistence;
  const own = tried === null && assumption === caseAssumption(settings);
  return { ...wish, assumption: own ? null : assumption };
}
