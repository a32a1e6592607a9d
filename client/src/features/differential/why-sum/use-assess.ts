import type { assess } from '@weighhouse/shared/reasoning/assess';
import { useEffect, useState } from 'react';

type Assess = typeof assess;

/** The method itself, fetched when a question needs it, so that it weighs on nobody's first load; null until then. */
export function useAssess(wanted: boolean): Assess | null {
  const [loaded, setLoaded] = useState<{ assess: Assess } | null>(null);
  useEffect(() => {
    if (!wanted || loaded) return;
    let current = true;
    void import('@weighhouse/shared/reasoning/assess').then((module) => {
      if (current) setLoaded({ assess: module.assess });
    });
    return () => {
      current = false;
    };
  }, [wanted, loaded]);
  return loaded?.assess ?? null;
}
