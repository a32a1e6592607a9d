import type { PanelView } from '@weighhouse/shared/contracts/differential';
import { useLedger } from '../ledger/ledger-context';

/** The numbers behind the assessment on the screen, and whether candidates exclude each other in it. */
export function usePanelInForce(): { panel: PanelView | null; oneCause: boolean } {
  const { differential, reading } = useLedger();
  const panel = differential.assessment ? reading.panel : null;
  return { panel, oneCause: reading.coexistence === 0 };
}
