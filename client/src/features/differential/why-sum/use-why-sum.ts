import type { AssessmentView } from '@weighhouse/shared/contracts/assessment';
import type { PanelView } from '@weighhouse/shared/contracts/differential';
import { useEffect, useMemo, useState } from 'react';
import { columnSum } from './column-sum';
import { type Against } from './comparison';
import { countedPanel } from './counted-panel';
import { oneCauseStandings, orderBySize, stepSum } from './step-sum';
import { useAssess } from './use-assess';
import type { WhySum } from './why-sum';

/** A sum, or how far the adding up has come where the method has to be asked for every step. */
export type SumState = { sum: WhySum } | { done: number; of: number };

/**
 * Why a column stands where it does. Under one cause it follows from the assessment at once. Where candidates may
 * coexist the method is asked for the standing after every finding, a few at a time so that the page stays awake.
 */
export function useWhySum(
  assessment: AssessmentView,
  panel: PanelView | null,
  column: number,
  against: Against,
): SumState {
  const oneCause = (panel?.coexistence ?? 0) === 0;
  const direct = useMemo(() => {
    if (!oneCause) return null;
    if (against !== 'rest') return columnSum(assessment, column, against);
    const order = orderBySize(assessment, column, against, true);
    return stepSum(order, oneCauseStandings(assessment), { column, against, oneCause: true });
  }, [oneCause, assessment, column, against]);
  const order = useMemo(
    () => (oneCause ? [] : orderBySize(assessment, column, against, false)),
    [oneCause, assessment, column, against],
  );
  const standings = useStandings(oneCause ? null : panel, order);
  return useMemo(() => {
    if (direct) return { sum: direct };
    if (standings.length <= order.length) return { done: standings.length, of: order.length + 1 };
    const standingWith = (counted: readonly string[]) => standings[counted.length] ?? [];
    return { sum: stepSum(order, standingWith, { column, against, oneCause: false }) };
  }, [direct, standings, order, column, against]);
}

const none: readonly number[][] = [];

/** The standing with none of these findings counted, with the first, with the first two, and so on. */
function useStandings(panel: PanelView | null, order: readonly string[]): readonly number[][] {
  const assess = useAssess(panel !== null);
  const [found, setFound] = useState<{ for: unknown; standings: readonly number[][] }>({
    for: null,
    standings: none,
  });
  useEffect(() => {
    if (!panel || !assess) return;
    const standings: number[][] = [];
    let timer: ReturnType<typeof setTimeout> | undefined;
    const some = () => {
      const until = performance.now() + 12;
      while (standings.length <= order.length && performance.now() < until) {
        const counted = countedPanel(panel, order.slice(0, standings.length));
        standings.push(assess(counted, { only: 'standing' }).standing);
      }
      setFound({ for: order, standings: [...standings] });
      if (standings.length <= order.length) timer = setTimeout(some);
    };
    timer = setTimeout(some);
    return () => {
      clearTimeout(timer);
    };
  }, [panel, assess, order]);
  return found.for === order ? found.standings : none;
}
