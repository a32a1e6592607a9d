import type { CSSProperties } from 'react';
import type { ShownColumn } from './arrange';

/** What a cell needs to stay at the edge of its frame. */
export function stuckProps({ stuck, offset }: Pick<ShownColumn, 'stuck' | 'offset'>, className: string) {
  if (stuck === null) return { className };
  return {
    className: `${className} ledger-stuck`,
    'data-stuck': stuck,
    style: stuck === 'left' ? ({ '--stuck-at': `${String(offset)}px` } as CSSProperties) : undefined,
  };
}
