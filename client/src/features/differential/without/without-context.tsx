import { createContext, type ReactNode, use, useMemo, useState, useSyncExternalStore } from 'react';
import { useLedger } from '../ledger/ledger-context';
import { voiceName } from '../model/people';
import { type LeftOut, standingWithout } from './left-out';
import { WithoutStore } from './without-store';
import { withoutSentence } from './without-words';

const WithoutContext = createContext<WithoutStore | null>(null);

export function WithoutProvider({ children }: { children: ReactNode }) {
  const [store] = useState(() => new WithoutStore());
  return <WithoutContext value={store}>{children}</WithoutContext>;
}

export function useWithoutStore(): WithoutStore {
  const store = use(WithoutContext);
  if (!store) throw new Error('used outside the ledger');
  return store;
}

export interface Without {
  left: LeftOut;
  held: boolean;
  /** Null where nobody is left whose numbers count. */
  standing: readonly number[] | null;
  sentence: string;
}

/** The standing without what somebody points at, from the reading in force; null while nobody points at anything. */
export function useWithout(): Without | null {
  const store = useWithoutStore();
  const pointing = useSyncExternalStore(store.subscribe, store.pointing);
  const { differential, columns, rows } = useLedger();
  return useMemo(() => {
    const { assessment } = differential;
    if (!pointing || !assessment) return null;
    const { left, held } = pointing;
    const standing = standingWithout(assessment, left);
    if (standing === undefined) return null;
    const title = rows.find(({ id }) => id === left.id)?.title ?? 'this finding';
    const name = left.kind === 'finding' ? `“${title}”` : withoutName(voiceName(differential, left.id));
    return { left, held, standing, sentence: withoutSentence(name, assessment.standing, standing, columns) };
  }, [pointing, differential, columns, rows]);
}

/** "Without you", "without Dr A". */
const withoutName = (name: string) => (name === 'You' ? 'you' : name);

/** Whether the standing without it can be shown. */
export function useCanLeaveOut(): (left: LeftOut) => boolean {
  const { assessment } = useLedger().differential;
  return (left) => assessment !== null && standingWithout(assessment, left) !== undefined;
}
