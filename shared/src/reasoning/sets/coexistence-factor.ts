/**
 * ln τ such that Σ_{m≥2} τ^(m-1) W_m = c / (1 - c): sets of two or more then
 * have the share c of the prior.
 *
 * In logarithms the sum is convex in ln τ with a slope of at least 1, so
 * Newton's steps arrive from above without ever overshooting twice; they stop
 * where rounding does.
 *
 * @param sums W_m at index m
 * @param coexistence c, above 0 to 0.5
 * @returns null where all W_m from 2 on are 0: then coexistence has no effect
 * @example logCoexistenceFactor([1, 1, 0.25], 0.2) // ln 1, for 1 × 0.25 = 0.2 / 0.8
 */
export function logCoexistenceFactor(sums: ArrayLike<number>, coexistence: number): number | null {
  const target = Math.log(coexistence / (1 - coexistence));
  const logs = Array.from(sums, Math.log);
  let most = -Infinity;
  let logTau = Infinity;
  for (let size = 2; size < logs.length; size += 1) {
    if (logs[size]! === -Infinity) continue;
    most = Math.max(most, logs[size]!);
    // With this size alone τ would have to be as large as this; with the others it is smaller.
    logTau = Math.min(logTau, (target - logs[size]!) / (size - 1));
  }
  if (most === -Infinity) return null;
  for (let step = 0; step < 100; step += 1) {
    let top = -Infinity;
    for (let size = 2; size < logs.length; size += 1) top = Math.max(top, logs[size]! + (size - 1) * logTau);
    let sum = 0;
    let slope = 0;
    for (let size = 2; size < logs.length; size += 1) {
      const term = Math.exp(logs[size]! + (size - 1) * logTau - top);
      sum += term;
      slope += (size - 1) * term;
    }
    const change = ((target - top - Math.log(sum)) * sum) / slope;
    logTau += change;
    if (Math.abs(change) <= 1e-16 * Math.max(1, Math.abs(logTau))) break;
  }
  return logTau;
}
