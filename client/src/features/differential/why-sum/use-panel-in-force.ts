import type { PanelView } from '@weighhouse/shared/contracts/differential';
import { usePanel } from '../api/get-panel';
import { useLedger } from '../ledger/ledger-context';

/** The numbers behind the assessment on the screen, and whether candidates exclude each other in it. */
export function usePanelInForce(): { panel: PanelView | null; oneCause: boolean } {
  const { differential, may } = useLedger();
  const wanted = differential.assessment !== null && may('panel.read');
  const panel = usePanel(differential.caseId, wanted).data ?? null;
  return { panel: wanted ? panel : null, oneCause: (panel?.coexistence ?? 0) === 0 };
}
