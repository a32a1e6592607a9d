import { noWish, type Wish, wishSchema } from './wish';

/**
 * What somebody wants to see lives as long as its tab, and for one person on one case. It is never sent anywhere: what
 * is kept of a trial goes by saving one's own judgements.
 */
const keyOf = (personId: string, caseId: string) => `weighhouse.reading.${personId}.${caseId}`;

export function recallWish(personId: string, caseId: string): Wish {
  try {
    const text = sessionStorage.getItem(keyOf(personId, caseId));
    return text === null ? noWish : (wishSchema.safeParse(JSON.parse(text)).data ?? noWish);
  } catch {
    return noWish;
  }
}

export function rememberWish(personId: string, caseId: string, wish: Wish): void {
  try {
    if (wish === noWish) sessionStorage.removeItem(keyOf(personId, caseId));
    else sessionStorage.setItem(keyOf(personId, caseId), JSON.stringify(wish));
  } catch {
    // A forbidden or full storage takes nothing from what is on the page.
  }
}
