import type { Finding } from '@weighhouse/shared/contracts/findings';
import { useState } from 'react';
import { useSaveRowJudgement } from '../api/save-row-judgement';
import { useDraftStore } from '../drafts/drafts-context';
import { useDraft } from '../drafts/use-draft';
import { useLedger } from '../ledger/ledger-context';
import { levelCount } from '../model/finding-words';
import { type Draft, withText } from '../typing/draft';
import { type DraftFault, readRow } from '../typing/read-draft';

/** What the row editor does: typing, saving, clearing and taking a clearing back. */
export function useRowSaving(finding: Finding) {
  const { saved: differential, columns } = useLedger();
  const store = useDraftStore();
  const hand = useDraft(differential, finding.id, columns);
  const save = useSaveRowJudgement(differential.caseId);
  const [faults, setFaults] = useState<DraftFault[]>([]);
  const [cleared, setCleared] = useState<Draft | null>(null);
  const levels = levelCount(finding);

  const send = async (draft: Draft, over: boolean): Promise<boolean> => {
    const read = readRow(draft, columns, levels);
    setFaults(read.faults);
    if (read.faults.length > 0) return false;
    if (hand.overtaken && !over) return false;
    await store.settle(finding.id);
    const { mine, candidateSet } = differential;
    const exposure = read.filled === 0 ? null : draft.exposure;
    const reason = draft.reason.trim();
    try {
      await save.mutateAsync({
        findingId: finding.id,
        candidateSet,
        ...(mine ? { version: mine.version } : {}),
        exposure,
        outOf100: read.outOf100,
        ...(reason === '' ? {} : { reason }),
      });
    } catch {
      // The mutation holds the error for the screen; what was typed stays.
      return false;
    }
    store.forget(finding.id);
    return true;
  };

  return {
    ...hand,
    levels,
    faults,
    error: save.error,
    busy: save.isPending,
    cleared,
    typeText: (columnId: string, level: number, text: string) => {
      setFaults((known) => known.filter((fault) => fault.columnId !== columnId));
      hand.type(withText(hand.draft, columnId, level, levels > 2 ? levels : 1, text));
    },
    typeMore: (more: Partial<Pick<Draft, 'exposure' | 'reason'>>) => {
      if (more.exposure !== undefined) setFaults((known) => known.filter((fault) => fault.columnId !== null));
      hand.type({ ...hand.draft, ...more });
    },
    save: async (over = false) => {
      if (await send(hand.draft, over)) setCleared(null);
    },
    clear: async () => {
      const before = hand.saved;
      const blank: Draft = { ...hand.draft, cells: new Map(), exposure: null, reason: '' };
      if (await send(blank, true)) setCleared(before);
    },
    takeBack: async () => {
      if (cleared && (await send(cleared, true))) setCleared(null);
    },
    backToSaved: () => {
      setFaults([]);
      hand.type(hand.saved);
    },
  };
}
