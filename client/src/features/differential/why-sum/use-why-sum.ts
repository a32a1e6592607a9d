import type { AssessmentView } from '@weighhouse/shared/contracts/assessment';
import type { PanelView } from '@weighhouse/shared/contracts/differential';
import { useEffect, useMemo, useState } from 'react';
import { columnSum } from './column-sum';
import { countedPanel } from './counted-panel';
import { type Comparison, countingFindings, oneCauseStandings, stepByStep, stepSum } from './step-sum';
import { useAssess } from './use-assess';
import type { WhySum } from './why-sum';

/** A sum, or how far the adding up has come where the method has to be asked for every step. */
export type SumState = { sum: WhySum } | { done: number; of: number };

/** Milliseconds that adding up may take before the page has its turn. */
const turn = 12;

/**
 * Why a column stands where it does. Under one cause it follows from the assessment at once. Where candidates may
 * coexist the method is asked for the standing after every finding, a few at a time so that the page stays awake.
 */
export function useWhySum(
  assessment: AssessmentView,
  panel: PanelView | null,
  { column, against, oneCause }: Comparison,
): SumState {
  const direct = useMemo(() => {
    if (!oneCause) return null;
    if (against !== 'rest') return columnSum(assessment, column, against);
    return stepSum(countingFindings(assessment), oneCauseStandings(assessment), {
      column,
      against,
      oneCause: true,
    });
  }, [oneCause, assessment, column, against]);
  const asked = useAskedSum(oneCause ? null : panel, assessment, { column, against, oneCause });
  return direct ? { sum: direct } : asked;
}

function useAskedSum(
  panel: PanelView | null,
  assessment: AssessmentView,
  { column, against, oneCause }: Comparison,
): SumState {
  const assess = useAssess(panel !== null);
  const of = 2 * countingFindings(assessment).length + 2;
  const [state, setState] = useState<SumState>({ done: 0, of });
  useEffect(() => {
    if (!panel || !assess) return;
    const steps = stepByStep(
      countingFindings(assessment),
      (counted) => assess(countedPanel(panel, counted), { only: 'standing' }).standing,
      { column, against, oneCause },
    );
    let timer: ReturnType<typeof setTimeout> | undefined;
    const some = () => {
      const until = performance.now() + turn;
      for (;;) {
        const next = steps.next();
        if (next.done === true) {
          setState({ sum: next.value });
          return;
        }
        if (performance.now() < until) continue;
        setState({ done: next.value, of });
        timer = setTimeout(some);
        return;
      }
    };
    timer = setTimeout(some);
    return () => {
      clearTimeout(timer);
    };
  }, [panel, assess, assessment, column, against, oneCause, of]);
  return state;
}
