import { useEffect, useState, useSyncExternalStore } from 'react';
import { type DraftKind, DraftKeeper, type Stored } from './draft-keeper';

/**
 * A text that is saved while it is typed. `kind` is read once; give the component another key for another text.
 * @param stored what the server has, the same object as long as it is the same text
 */
export function useDraftKeeper<T>(kind: () => DraftKind<T>, stored: Stored<T>) {
  const [keeper] = useState(() => new DraftKeeper(kind(), stored));
  useEffect(() => keeper.start(), [keeper]);
  useEffect(() => {
    keeper.offer(stored);
  }, [keeper, stored]);
  return { keeper, ...useSyncExternalStore(keeper.subscribe, keeper.read) };
}
