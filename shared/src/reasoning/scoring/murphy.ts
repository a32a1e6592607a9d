import { type Forecast, reliabilityBin } from './reliability-bins.js';

/** brier = reliability - resolution + uncertainty + withinVariance - withinCovariance. */
export interface Decomposition {
  /** Mean of (share - happened)² over the pairs, 0 to 1. */
  brier: number;
  /** How far what happened is from what was said: 0 is best. */
  reliability: number;
  /** How far the groups differ in what happened: more is better. */
  resolution: number;
  /** How uncertain the outcome was to begin with. */
  uncertainty: number;
  /** What the differences of shares within a group add and take; 0 where a group has one share. */
  withinVariance: number;
  withinCovariance: number;
}

/**
 * Takes the Brier score of (share, happened) pairs apart.
 *
 * Sources: Murphy 1973, J. Appl. Meteorol. 12:595-600; the two terms within the
 * groups, without which the parts only add up for groups of a single share,
 * Stephenson, Coelho & Jolliffe 2008, Weather and Forecasting 23:752-757.
 *
 * @param groups forecasts cut into groups that are not empty, such as by `equalCountBins`
 * @throws RangeError where there are no groups
 */
export function murphyDecomposition(groups: readonly (readonly Forecast[])[]): Decomposition {
  if (groups.length === 0) throw new RangeError('nothing to take apart');
  const all = groups.flat();
  const meanOf = (values: readonly number[]) => values.reduce((sum, value) => sum + value, 0) / all.length;
  const outcome = ({ happened }: Forecast) => (happened ? 1 : 0);
  const base = meanOf(all.map(outcome));
  const binned = groups.map((group) => ({ group, bin: reliabilityBin(group) }));
  return {
    brier: meanOf(all.map((one) => (one.share - outcome(one)) ** 2)),
    reliability: meanOf(binned.map(({ bin }) => bin.count * (bin.meanShare - bin.happened) ** 2)),
    resolution: meanOf(binned.map(({ bin }) => bin.count * (bin.happened - base) ** 2)),
    uncertainty: base * (1 - base),
    withinVariance: meanOf(
      binned.flatMap(({ group, bin }) => group.map(({ share }) => (share - bin.meanShare) ** 2)),
    ),
    withinCovariance:
      2 *
      meanOf(
        binned.flatMap(({ group, bin }) =>
          group.map((one) => (one.share - bin.meanShare) * (outcome(one) - bin.happened)),
        ),
      ),
  };
}
