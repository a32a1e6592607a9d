import { useState } from 'react';
import { useSavePrior } from '../api/save-prior';
import { useSaveRowJudgement } from '../api/save-row-judgement';
import { useLedger } from '../ledger/ledger-context';
import { trialPrior, tryOnRow } from './apply-to-ledger';
import { hasOwn, isEmptyTrial, type Trial, withRow } from './trial';

/** Saves of a trial what is one's own judgement, row by row, as new versions; the rest stays a trial. */
export function useKeepMine() {
  const { saved, reading, columns, canJudge } = useLedger();
  const savePrior = useSavePrior(saved.caseId);
  const saveRow = useSaveRowJudgement(saved.caseId);
  const [said, setSaid] = useState('');
  const [error, setError] = useState<unknown>(null);
  const [busy, setBusy] = useState(false);
  const { mine, candidateSet } = saved;

  /** One save after the other, because each begins from the version that the one before it made. */
  const keepAll = async (): Promise<Trial> => {
    let { trial } = reading;
    let version = mine?.version ?? 0;
    const take = (next: Trial) => {
      trial = next;
      reading.tryOut(next);
    };
    const prior = trialPrior(trial, columns);
    if (prior) {
      const reason = mine?.prior?.reason;
      const body = { candidateSet, version, outOf100: prior, ...(reason ? { reason } : {}) };
      ({ version } = await savePrior.mutateAsync(body));
      take({ ...trial, prior: null });
    }
    for (const [findingId, row] of Object.entries(trial.rows)) {
      const known = mine?.findings.find((one) => one.findingId === findingId);
      const finding = saved.findings.find((one) => one.id === findingId);
      const tried = tryOnRow(findingId, known, row, columns);
      if (!tried || !finding || finding.enteredInError) continue;
      const { exposure, outOf100, reason } = tried;
      const body = { findingId, candidateSet, version, exposure, outOf100, ...(reason ? { reason } : {}) };
      ({ version } = await saveRow.mutateAsync(body));
      take(withRow(trial, findingId, null));
    }
    return trial;
  };

  return {
    can: canJudge && hasOwn(reading.trial),
    said,
    error,
    busy,
    keep: async () => {
      setBusy(true);
      setSaid('');
      setError(null);
      try {
        const rest = await keepAll();
        setSaid(keptSentence(rest));
      } catch (failed) {
        setError(failed);
      }
      setBusy(false);
    },
  };
}

export type KeepMine = ReturnType<typeof useKeepMine>;

/** What was kept and what was not, by what is left of the trial. */
export function keptSentence(rest: Trial): string {
  if (isEmptyTrial(rest)) return 'Saved as your judgement. Nothing of the trial is left.';
  return hasOwn(rest)
    ? 'Saved as your judgement, except where something is missing: a row counts once you say how often you see it, a prior once its shares sum to 100. The rest stays a trial.'
    : 'Saved as your judgement. What is not yours to judge stays a trial: drop it when you have seen enough.';
}
