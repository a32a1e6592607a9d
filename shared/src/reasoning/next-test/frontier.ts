/** What a test settles, and what it takes in money, days and burden. */
export interface Costed {
  bits: number;
  cost: number;
  waitDays: number;
  burden: number;
}

const equalBits = 1e-12;

/**
 * For each test whether no other settles at least as much for at most the same
 * cost, wait and burden, being better in one of them. There is no exchange
 * rate between these: nobody could say what it should be.
 *
 * @example onFrontier([{ bits: 1, cost: 9, waitDays: 0, burden: 0 }, { bits: 1, cost: 5, waitDays: 0, burden: 0 }]) // [false, true]
 */
export function onFrontier(tests: readonly Costed[]): boolean[] {
  return tests.map((test) => !tests.some((other) => outdoes(other, test)));
}

function outdoes(other: Costed, test: Costed): boolean {
  const atLeast =
    other.bits >= test.bits - equalBits &&
    other.cost <= test.cost &&
    other.waitDays <= test.waitDays &&
    other.burden <= test.burden;
  const better =
    other.bits > test.bits + equalBits ||
    other.cost < test.cost ||
    other.waitDays < test.waitDays ||
    other.burden < test.burden;
  return atLeast && better;
}
