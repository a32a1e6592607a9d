import { wilsonInterval } from './wilson-interval.js';

/** A share that was given to something, and whether it happened. */
export interface Forecast {
  share: number;
  happened: boolean;
}

/** How often things happened that were given about the same share. */
export interface ReliabilityBin {
  count: number;
  meanShare: number;
  /** Share of them that happened, and its 95% Wilson interval. */
  happened: number;
  low: number;
  high: number;
}

/**
 * Cuts forecasts, sorted by share, into at most `bins` groups of about equal
 * count. Equal shares stay together, so that the order they come in does not
 * matter; there can be fewer groups for that reason.
 *
 * @throws RangeError for a number of bins below 1, or a share outside 0 to 1
 */
export function equalCountBins(forecasts: readonly Forecast[], bins: number): Forecast[][] {
  if (!(Number.isInteger(bins) && bins >= 1)) throw new RangeError(`not a number of bins: ${bins}`);
  const sorted = [...forecasts].sort((one, other) => one.share - other.share);
  for (const { share } of sorted)
    if (!(share >= 0 && share <= 1)) throw new RangeError(`not a share: ${share}`);
  const groups: Forecast[][] = [];
  let start = 0;
  for (let bin = 1; bin <= bins; bin += 1) {
    let end = Math.round((bin * sorted.length) / bins);
    while (end > start && end < sorted.length && sorted[end]!.share === sorted[end - 1]!.share) end += 1;
    if (end <= start) continue;
    groups.push(sorted.slice(start, end));
    start = end;
  }
  return groups;
}

/** One group of forecasts, not empty, as a point of a reliability diagram. */
export function reliabilityBin(group: readonly Forecast[]): ReliabilityBin {
  const count = group.length;
  const successes = group.filter(({ happened }) => happened).length;
  return {
    count,
    meanShare: group.reduce((sum, { share }) => sum + share, 0) / count,
    happened: successes / count,
    ...wilsonInterval(successes, count),
  };
}

/** The reliability diagram of forecasts in at most `bins` groups; empty where there are none. */
export function reliabilityBins(forecasts: readonly Forecast[], bins: number): ReliabilityBin[] {
  return equalCountBins(forecasts, bins).map(reliabilityBin);
}
