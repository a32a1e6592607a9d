import type { Differential, PanelView } from '@weighhouse/shared/contracts/differential';
import { useCallback, useMemo, useState } from 'react';
import { useCase } from '../../cases/api/get-case';
import { useSignedIn } from '../../people/api/get-me';
import { usePanel } from '../api/get-panel';
import type { Column } from '../model/columns';
import { type Trial } from '../trial/trial';
import { recallWish, rememberWish } from './kept-wish';
import { readLedger, wishedPanel } from './read-ledger';
import { isHeavy, useAssessed } from './use-assessed';
import { type Assumption, assumed, isPanelsOwn, noWish, type Wish } from './wish';

/** Which reading of the numbers is on the screen, and how to choose another. */
export interface Reading {
  /** The panel's own; otherwise one that this person chose and nobody else sees. */
  panelsOwn: boolean;
  /** `computing`: what is wished is not on the screen yet. `refused`: it cannot be computed. */
  state: 'shown' | 'computing' | 'refused';
  /** It takes long enough to be computed beside the page. */
  heavy: boolean;
  /** The share with two or more of the candidates at once; 0 is one cause. */
  coexistence: number;
  /** The numbers behind the assessment on the screen, as assess() takes them; null while they are not here. */
  panel: PanelView | null;
  trial: Trial;
  assume: (assumption: Assumption) => void;
  tryOut: (trial: Trial) => void;
  /** Back to the panel's own reading. */
  back: () => void;
}

/**
 * Reads the ledger as this person wishes: the panel's own reading as the server computed it, or another one of the
 * same numbers, computed here by the same function.
 */
export function useReading(
  saved: Differential,
  columns: readonly Column[],
): { differential: Differential; reading: Reading } {
  const { caseId, settings } = saved;
  const { id: personId } = useSignedIn();
  const [wish, setWish] = useState<Wish>(() => recallWish(personId, caseId));
  const panelsOwn = isPanelsOwn(wish, settings);
  const mayRead = saved.assessment !== null && saved.abilities.includes('panel.read');
  const asked = usePanel(caseId, mayRead);
  const pooled = mayRead ? (asked.data ?? null) : null;
  const weight = useOwnWeight(caseId, personId);
  const wished = useMemo(
    () => wishedPanel(saved, pooled, wish, columns, weight),
    [saved, pooled, wish, columns, weight],
  );
  const { assessment, state } = useAssessed(wished);
  const fits = assessment !== null && assessment.standing.length === columns.length;
  const differential = useMemo(
    () => (!panelsOwn && fits ? readLedger(saved, wish, columns, assessment) : saved),
    [saved, wish, columns, assessment, panelsOwn, fits],
  );
  const choose = useCallback(
    (next: Wish) => {
      setWish(next);
      rememberWish(personId, caseId, next);
    },
    [personId, caseId],
  );
  const failed = state === 'refused' || (asked.isError && !pooled && saved.assessment !== null);
  const reading = useMemo<Reading>(
    () => ({
      panelsOwn,
      state: panelsOwn || (state === 'ready' && fits) ? 'shown' : failed ? 'refused' : 'computing',
      heavy: wished !== null && isHeavy(wished),
      coexistence: differential.settings.coexistence,
      panel: saved.assessment && differential !== saved ? wished : pooled,
      trial: wish.trial,
      assume: (assumption) => {
        choose(assumed(wish, assumption, settings));
      },
      tryOut: (trial) => {
        choose({ ...wish, trial });
      },
      back: () => {
        choose(noWish);
      },
    }),
    [panelsOwn, state, fits, failed, differential, saved, wished, pooled, wish, choose, settings],
  );
  return { differential, reading };
}

/** What one weighs on this case; 1 for somebody who is not known there. */
function useOwnWeight(caseId: string, personId: string): number {
  const team = useCase(caseId).data?.team ?? [];
  return team.find((one) => one.part === 'contributor' && one.person.id === personId)?.weight ?? 1;
}
