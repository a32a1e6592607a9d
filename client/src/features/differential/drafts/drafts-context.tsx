import type { Differential } from '@weighhouse/shared/contracts/differential';
import { createContext, type ReactNode, use, useEffect, useState } from 'react';
import { useLiveState } from '../../../lib/live';
import { useSignedIn } from '../../people/api/get-me';
import { keepDraft } from '../api/keep-draft';
import { DraftStore } from './draft-store';
import { recallDraft, rememberDraft } from './kept-drafts';

const DraftsContext = createContext<DraftStore | null>(null);

/** Holds what is typed on this case while its differential is open. */
export function DraftsProvider({
  differential,
  children,
}: {
  differential: Differential;
  children: ReactNode;
}) {
  const { caseId, findings } = differential;
  const { id: personId } = useSignedIn();
  const [store] = useState(
    () =>
      new DraftStore({
        send: (draft) => keepDraft(caseId, draft),
        remember: (target, typed) => {
          rememberDraft(personId, caseId, target, typed);
        },
        recall: (target) => recallDraft(personId, caseId, target),
      }),
  );
  useEffect(() => {
    store.recall(['prior', ...findings.map((finding) => finding.id)]);
  }, [store, findings]);
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
