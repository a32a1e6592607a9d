import type { AssessmentView } from '@weighhouse/shared/contracts/assessment';
import type { PanelView } from '@weighhouse/shared/contracts/differential';
import { useEffect, useMemo, useState } from 'react';
import { useAssess } from '../why-sum/use-assess';

/** What a panel comes to, computed in this browser. While it is computed, `assessment` is the one before it. */
export interface Assessed {
  assessment: AssessmentView | null;
  state: 'none' | 'computing' | 'ready' | 'refused';
}

/**
 * Candidates that may coexist make two to the number of candidates sets. Up to twelve candidates the whole assessment
 * takes some 20 ms; each one more doubles that, which would be felt on the page.
 */
const mostOnPage = 12;

export const isHeavy = ({ candidates, coexistence }: PanelView) =>
  coexistence > 0 && candidates.length > mostOnPage;

/** Assesses a panel by the method that the server uses: at once, or beside the page where it takes long. */
export function useAssessed(panel: PanelView | null): Assessed {
  const heavy = panel !== null && isHeavy(panel);
  const beside = useBeside(heavy ? panel : null);
  const assess = useAssess(panel !== null && !heavy);
  const atOnce = useMemo((): Assessed => {
    if (!panel || heavy || !assess) return { assessment: null, state: panel ? 'computing' : 'none' };
    try {
      return { assessment: assess(panel), state: 'ready' };
    } catch {
      return { assessment: null, state: 'refused' };
    }
  }, [panel, heavy, assess]);
  return heavy ? beside : atOnce;
}

interface Found {
  of: PanelView | null;
  assessment: AssessmentView | null;
}

function useBeside(panel: PanelView | null): Assessed {
  const [found, setFound] = useState<Found>({ of: null, assessment: null });
  useEffect(() => {
    if (!panel) return;
    const worker = new Worker(new URL('./assess.worker.ts', import.meta.url), { type: 'module' });
    worker.addEventListener('message', ({ data }: MessageEvent<AssessmentView | null>) => {
      setFound({ of: panel, assessment: data });
      worker.terminate();
    });
    worker.addEventListener('error', () => {
      setFound({ of: panel, assessment: null });
    });
    worker.postMessage(panel);
    return () => {
      worker.terminate();
    };
  }, [panel]);
  if (!panel) return { assessment: null, state: 'none' };
  if (found.of !== panel) return { assessment: found.assessment, state: 'computing' };
  return { assessment: found.assessment, state: found.assessment ? 'ready' : 'refused' };
}
