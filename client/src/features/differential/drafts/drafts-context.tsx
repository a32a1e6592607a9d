import type { Differential } from '@weighhouse/shared/contracts/differential';
import { createContext, type ReactNode, use, useEffect, useRef, useState } from 'react';
import { useLiveState } from '../../../lib/live';
import { useSignedIn } from '../../people/api/get-me';
import { keepDraft } from '../api/keep-draft';
import { columnsOf } from '../model/columns';
import { wireDraft } from '../typing/draft';
import { DraftStore } from './draft-store';
import { recallDraft, rememberDraft } from './kept-drafts';

const DraftsContext = createContext<DraftStore | null>(null);

/** Holds what is typed on this case while its differential is open. */
export function DraftsProvider({ differential, children }: { differential: Differential; children: ReactNode }) {
  const { caseId } = differential;
  const { id: personId } = useSignedIn();
  const latest = useRef(differential);
  useEffect(() => {
    latest.current = differential;
  }, [differential]);
  const [store] = useState(
    () =>
      new DraftStore({
        send: (draft) => keepDraft(caseId, draft),
        wire: (target, draft) => {
          const { candidates, candidateSet } = latest.current;
          return wireDraft(target, { ...draft, candidateSet }, columnsOf(candidates));
        },
        remember: (target, draft) => {
          rememberDraft(personId, caseId, target, draft);
        },
        recall: (target) => recallDraft(personId, caseId, target),
      }),
  );
  const live = useLiveState();
  useEffect(() => {
    if (live === 'connected') store.sendAll();
  }, [live, store]);
  useEffect(() => {
    const send = () => {
      store.sendAll();
    };
    window.addEventListener('online', send);
    window.addEventListener('pagehide', send);
    return () => {
      window.removeEventListener('online', send);
      window.removeEventListener('pagehide', send);
      store.sendAll();
    };
  }, [store]);
  return <DraftsContext value={store}>{children}</DraftsContext>;
}

export function useDraftStore(): DraftStore {
  const store = use(DraftsContext);
  if (!store) throw new Error('used outside the differential');
  return store;
}
