import type { PanelView } from '@weighhouse/shared/contracts/differential';
import { useMemo } from 'react';
import { useAssess } from './use-assess';

/** Where the panel would stand if every finding counted in full; null where nothing is tempered, or until it is known. */
export function useInFull(panel: PanelView | null): readonly number[] | null {
  const wanted = panel !== null && panel.tempering < 1;
  const assess = useAssess(wanted);
  return useMemo(
    () =>
      panel && wanted && assess ? assess({ ...panel, tempering: 1 }, { only: 'standing' }).standing : null,
    [panel, wanted, assess],
  );
}
