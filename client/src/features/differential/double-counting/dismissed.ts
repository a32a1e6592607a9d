import { useState } from 'react';
import { z } from 'zod';

const keysSchema = z.array(z.string());

/** What somebody said does not count twice: for oneself, on one case, in this browser. It holds ids and no words. */
export function useDismissed(personId: string, caseId: string) {
  const place = `weighhouse.not-twice.${personId}.${caseId}`;
  const [keys, setKeys] = useState<readonly string[]>(() => recall(place));
  return {
    isDismissed: (key: string) => keys.includes(key),
    dismissed: keys.length,
    dismiss: (key: string) => {
      const next = [...keys, key];
      setKeys(next);
      remember(place, next);
    },
    showAgain: () => {
      setKeys([]);
      remember(place, []);
    },
  };
}

function recall(place: string): readonly string[] {
  try {
    return keysSchema.safeParse(JSON.parse(localStorage.getItem(place) ?? '[]')).data ?? [];
  } catch {
    return [];
  }
}

function remember(place: string, keys: readonly string[]): void {
  try {
    localStorage.setItem(place, JSON.stringify(keys));
  } catch {
    // Full or forbidden: then it is said again on the next visit, which harms nobody.
  }
}
