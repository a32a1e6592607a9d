import type { AssessmentView } from '@weighhouse/shared/contracts/assessment';
import type { Differential, PanelView } from '@weighhouse/shared/contracts/differential';
import type { Column } from '../model/columns';
import { tryOnLedger } from '../trial/apply-to-ledger';
import { type OwnVoice, tryOnPanel } from '../trial/apply-to-panel';
import { ownPanel } from './own-panel';
import { isPanelsOwn, type Wish, wishedCoexistence } from './wish';

/**
 * The panel that a wish reads: the pool's with the wish applied, or where the others' numbers are sealed one's own
 * alone. Null where the panel's own reading is wished, which the server has computed already, or where there is
 * nothing to read.
 * @param pooled the numbers behind the pool; null while they are not here
 */
export function wishedPanel(
  saved: Differential,
  pooled: PanelView | null,
  wish: Wish,
  columns: readonly Column[],
  weight: number,
): PanelView | null {
  if (isPanelsOwn(wish, saved.settings)) return null;
  const coexistence = wishedCoexistence(wish, saved.settings);
  if (!saved.assessment) {
    if (!saved.mine) return null;
    const own = ownPanel(tryOnLedger(saved, wish.trial, columns), coexistence);
    return own.contributors.length > 0 && own.candidates.length > 0 ? own : null;
  }
  if (!pooled || !fitsColumns(pooled, columns)) return null;
  const voice: OwnVoice | null = saved.mine ? { key: saved.mine.key, weight } : null;
  return { ...tryOnPanel(pooled, wish.trial, columns, voice), coexistence };
}

/** A panel read before the candidates changed says nothing about the columns on the screen. */
const fitsColumns = ({ candidates }: PanelView, columns: readonly Column[]) =>
  candidates.length + 1 === columns.length && candidates.every((id, index) => columns[index]?.id === id);

/**
 * The ledger as the wish reads it, every number of it from this one assessment. The mark of the round before is left
 * out where it was read under another assumption.
 */
export function readLedger(
  saved: Differential,
  wish: Wish,
  columns: readonly Column[],
  assessment: AssessmentView,
): Differential {
  const tried = tryOnLedger(saved, wish.trial, columns);
  const coexistence = wishedCoexistence(wish, saved.settings);
  const settings = { ...tried.settings, coexistence };
  if (!saved.assessment)
    return { ...tried, settings, mine: tried.mine && { ...tried.mine, standing: assessment.standing } };
  const alike = coexistence > 0 === saved.settings.coexistence > 0;
  return { ...tried, settings, assessment, before: alike ? saved.before : null };
}
