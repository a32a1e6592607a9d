import type { ShownColumn } from '../columns/arrange';
import { ColumnMenu } from '../columns/column-menu';
import { stuckProps } from '../columns/stuck-props';
import { withSoftHyphens } from '../model/soft-hyphens';

interface Props {
  of: ShownColumn;
  menuOpen: boolean;
  onMenu: (open: boolean) => void;
}

/** A candidate at the head of its column; its name opens what can be done with the column. */
export function CandidateHeader({ of, menuOpen, onMenu }: Props) {
  const { column, folded, pinned } = of;
  return (
    <th scope="col" title={column.name} {...stuckProps(of, folded ? 'ledger-folded' : 'ledger-candidate')}>
      <ColumnMenu of={of} open={menuOpen} onOpenChange={onMenu}>
        <button type="button" className="ledger-head-button" tabIndex={-1}>
          <span className="ledger-letter">{column.letter}</span>
          <span className="aside-text">
            {column.name}
            {folded ? ', folded' : pinned ? ', pinned' : ''}
          </span>
          {!folded && (
            <span className="ledger-candidate-name" aria-hidden="true">
              {withSoftHyphens(column.short)}
            </span>
          )}
        </button>
      </ColumnMenu>
      {column.mustNotMiss && !folded && <span className="ledger-must">must not miss</span>}
    </th>
  );
}
