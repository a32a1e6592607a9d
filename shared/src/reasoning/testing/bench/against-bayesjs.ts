import bayesjs from 'bayesjs';
import { assess } from '../../assess.js';
import { sixteenConditions, sixteenConditionsFolded } from '../sixteen-conditions.js';
import type { Measured } from './panels.js';
import { timed } from './timed.js';

export interface Compared extends Measured {
  bayesjsMs: number;
  /** How many times as long the general library takes. */
  ratio: number;
}

/** The two-level network of 16 conditions, by `assess` and by the general Bayesian-network library bayesjs. */
export function measureNetwork(): Compared {
  const panel = sixteenConditions();
  const { network, evidence } = sixteenConditionsFolded();
  const ours = timed(() => assess(panel, { only: 'standing' }));
  const theirs = timed(() => bayesjs.inferAll(network, evidence, { precision: 15, force: true }));
  return {
    panel: 'noisyor-net20_40, first 16 conditions, 21 findings',
    what: 'standing alone, c > 0',
    ...ours,
    goalMs: 15,
    bayesjsMs: theirs.medianMs,
    ratio: theirs.medianMs / ours.medianMs,
  };
}
