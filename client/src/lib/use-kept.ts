import { useState } from 'react';
import type { z } from 'zod';
import { forget, keep, kept } from './kept';

/**
 * What is typed into a form that is sent as a whole. It survives a closed tab until it is sent and cleared.
 * @returns what is typed, how to change it, and how to clear it
 */
export function useKept<T>(key: string, schema: z.ZodType<T>, empty: T): [T, (next: T) => void, () => void] {
  const [typed, setTyped] = useState(() => schema.safeParse(kept(key)).data ?? empty);
  return [
    typed,
    (next) => {
      setTyped(next);
      keep(key, next);
    },
    () => {
      setTyped(empty);
      forget(key);
    },
  ];
}
