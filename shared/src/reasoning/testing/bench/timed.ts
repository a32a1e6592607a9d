export interface Timing {
  medianMs: number;
  p95Ms: number;
}

/**
 * Times something over and over: at least ten runs to warm up, then for about
 * `budgetMs` and at least 15 runs. Each run gets its own number, so that runs
 * can work on different inputs.
 */
export function timed(run: (index: number) => unknown, budgetMs = 1500): Timing {
  const warmUntil = performance.now() + budgetMs / 3;
  for (let index = 0; index < 10 || (performance.now() < warmUntil && index < 2000); index += 1) run(index);
  const times: number[] = [];
  const until = performance.now() + budgetMs;
  for (let index = 0; index < 15 || (performance.now() < until && index < 5000); index += 1) {
    const start = performance.now();
    run(index);
    times.push(performance.now() - start);
  }
  times.sort((one, other) => one - other);
  return { medianMs: quantile(times, 0.5), p95Ms: quantile(times, 0.95) };
}

function quantile(sorted: readonly number[], share: number): number {
  return sorted[Math.min(sorted.length - 1, Math.floor(share * sorted.length))]!;
}
