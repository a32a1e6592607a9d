import { useState } from 'react';

const key = 'weighhouse.compact-rows';

/** Whether the ledger's rows are narrow; remembered in this browser. */
export function useCompact() {
  const [compact, setCompact] = useState(() => localStorage.getItem(key) === 'yes');
  const set = (next: boolean) => {
    localStorage.setItem(key, next ? 'yes' : 'no');
    setCompact(next);
  };
  return [compact, set] as const;
}
