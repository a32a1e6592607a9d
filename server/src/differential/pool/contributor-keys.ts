import { createHmac } from 'node:crypto';

/**
 * An order of a case's contributors that follows nothing anybody knows: by a keyed hash of case and person. It is the
 * same in every view, so that sums are rounded the same way for all.
 * @param secret known to the server alone
 */
export function hiddenOrder(secret: string, caseId: string, personIds: readonly string[]): string[] {
  const tag = (personId: string) =>
    createHmac('sha256', secret).update(`contributor order ${caseId} ${personId}`).digest('hex');
  return personIds
    .map((personId) => ({ personId, tag: tag(personId) }))
    .sort((a, b) => (a.tag < b.tag ? -1 : 1))
    .map(({ personId }) => personId);
}

/** Keys without names, c1, c2 and so on, for those who may see numbers but not whose they are. */
export function anonymousKeys(order: readonly string[]): Map<string, string> {
  return new Map(order.map((personId, index) => [personId, `c${String(index + 1)}`]));
}
