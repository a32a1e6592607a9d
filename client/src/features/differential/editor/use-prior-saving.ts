import { useState } from 'react';
import { useSavePrior } from '../api/save-prior';
import { useDraftStore } from '../drafts/drafts-context';
import { useDraft } from '../drafts/use-draft';
import { useLedger } from '../ledger/ledger-context';
import { withText } from '../typing/draft';
import { readPrior } from '../typing/read-draft';

/** What the prior's form does: typing and saving. */
export function usePriorSaving() {
  const { saved: differential, columns } = useLedger();
  const store = useDraftStore();
  const hand = useDraft(differential, 'prior', columns);
  const save = useSavePrior(differential.caseId);
  const [tried, setTried] = useState(false);
  const shares = readPrior(hand.draft, columns);

  return {
    draft: hand.draft,
    saving: hand.saving,
    shares,
    tried,
    error: save.error,
    busy: save.isPending,
    typeText: (columnId: string, text: string) => {
      hand.type(withText(hand.draft, columnId, 0, 1, text));
    },
    typeReason: (reason: string) => {
      hand.type({ ...hand.draft, reason });
    },
    /** @returns whether it was saved */
    save: async (): Promise<boolean> => {
      setTried(true);
      if (!shares.complete) return false;
      await store.settle('prior');
      const { mine, candidateSet } = differential;
      const reason = hand.draft.reason.trim();
      try {
        await save.mutateAsync({
          candidateSet,
          ...(mine ? { version: mine.version } : {}),
          outOf100: shares.values.map((value) => value ?? 0),
          ...(reason === '' ? {} : { reason }),
        });
      } catch {
        // The mutation holds the error for the screen; what was typed stays.
        return false;
      }
      setTried(false);
      store.forget('prior');
      return true;
    },
  };
}
