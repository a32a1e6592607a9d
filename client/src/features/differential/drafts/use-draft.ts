import type { Differential } from '@weighhouse/shared/contracts/differential';
import { useCallback, useMemo, useSyncExternalStore } from 'react';
import type { Saving } from '../../../components/save-state';
import type { Column } from '../model/columns';
import { type Draft, draftFromWire, draftOfRow, emptyDraft, sameDraft, wireDraft } from '../typing/draft';
import { useDraftStore } from './drafts-context';

export interface DraftInHand {
  draft: Draft;
  /** What is saved, as texts; blank where nothing is. */
  saved: Draft;
  /** What stands in the fields is not what is saved. */
  changed: boolean;
  /** Saved by oneself elsewhere since the typing began. */
  overtaken: boolean;
  saving: Saving;
  type: (draft: Draft) => void;
}

/** What is saved of a row, as texts. A prior is never put into its fields again: it is asked anew. */
export function savedDraft(differential: Differential, target: string, columns: readonly Column[]): Draft {
  const { mine, candidateSet } = differential;
  const row = mine?.findings.find((one) => one.findingId === target);
  if (row) return draftOfRow(row, columns, candidateSet);
  return emptyDraft(candidateSet, target === 'prior' ? (mine?.prior?.version ?? 0) : 0);
}

/** What the server kept of an earlier typing, unless it says what is saved anyway. */
export function serverDraft(
  differential: Differential,
  target: string,
  columns: readonly Column[],
): Draft | null {
  const saved = savedDraft(differential, target, columns);
  const kept = differential.mine?.drafts.find((one) => one.target === target);
  if (!kept) return null;
  const draft = draftFromWire(kept, columns, differential.candidateSet, saved.base);
  return sameDraft(draft, saved, columns) ? null : draft;
}

/** The draft of a row or of the prior: what is typed here, else what the server kept, else what is saved. */
export function useDraft(
  differential: Differential,
  target: string,
  columns: readonly Column[],
): DraftInHand {
  const store = useDraftStore();
  const { candidateSet } = differential;
  const typed = useSyncExternalStore(store.subscribe, () => store.drafts().get(target) ?? null);
  const saving = useSyncExternalStore(store.subscribe, () => store.saving(target));
  const saved = useMemo(() => savedDraft(differential, target, columns), [differential, target, columns]);
  const kept = useMemo(() => serverDraft(differential, target, columns), [differential, target, columns]);
  const draft = typed ?? kept ?? saved;
  const type = useCallback(
    (next: Draft) => {
      store.type(target, { draft: next, wire: wireDraft(target, { ...next, candidateSet }, columns) });
    },
    [store, target, columns, candidateSet],
  );
  const changed = !sameDraft(draft, saved, columns);
  return { draft, saved, changed, overtaken: changed && draft.base !== saved.base, saving, type };
}

/** The rows that hold something typed and not saved, for the ledger and for handing in. */
export function useUnsavedTargets(
  differential: Differential,
  columns: readonly Column[],
): ReadonlySet<string> {
  const store = useDraftStore();
  const typed = useSyncExternalStore(store.subscribe, store.drafts);
  return useMemo(() => {
    const targets = new Set([...typed.keys(), ...(differential.mine?.drafts.map((one) => one.target) ?? [])]);
    const unsaved = [...targets].filter((target) => {
      const draft = typed.get(target) ?? serverDraft(differential, target, columns);
      return draft !== null && !sameDraft(draft, savedDraft(differential, target, columns), columns);
    });
    return new Set(unsaved);
  }, [typed, differential, columns]);
}
