import { assessChecked, standingOfChecked } from './assess-checked.js';
import type { Assessment, StandingOnly } from './assessment.js';
import type { Panel } from './panel.js';
import { readPanel } from './validation/read-panel.js';

export type * from './assessment.js';
export type * from './panel.js';
export { type Fault, PanelRefused } from './validation/panel-refused.js';

/**
 * What a panel's judgements come to: the pooled standing of every candidate and
 * of *none of these*, and what it depends on. Pure: no clock, no randomness, no
 * input or output. It supports a panel's discussion and is not a diagnosis.
 *
 * Input and answer are described in `panel.ts` and `assessment.ts`; all shares
 * are fractions. With `only: 'standing'` just the standing is computed.
 *
 * @throws PanelRefused, its `errors` naming every fault with its path
 * @example assess({ candidates: ['a'], contributors: [{ id: 'c', prior: [0.5, 0.5] }] }).standing // [0.5, 0.5]
 */
export function assess(panel: unknown, options: { only: 'standing' }): StandingOnly;
export function assess(panel: Panel): Assessment;
export function assess(panel: unknown): Assessment;
export function assess(panel: unknown, options: { only?: 'standing' } = {}): Assessment | StandingOnly {
  const checked = readPanel(panel);
  return options.only === 'standing' ? standingOfChecked(checked) : assessChecked(checked);
}
