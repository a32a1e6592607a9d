import { useLedger } from '../ledger/ledger-context';
import { rangeSentence } from '../model/range-words';
import { columnWord } from './sum-words';
import { useInFull } from './use-in-full';
import { usePanelInForce } from './use-panel-in-force';

/** How firm the leader's standing is, for the standing row; null where there is no pool. */
export function useLeaderRange(): string | null {
  const { differential, columns } = useLedger();
  const { panel } = usePanelInForce();
  const inFull = useInFull(panel);
  const { assessment } = differential;
  if (!assessment) return null;
  const leader = columns.find(({ index }) => assessment.standing[index] === Math.max(...assessment.standing));
  if (!leader) return null;
  const sentence = rangeSentence(assessment, leader.index, inFull?.[leader.index] ?? null);
  return leader.none ? `None of these: ${sentence}.` : `${columnWord(leader)} ${sentence}.`;
}
