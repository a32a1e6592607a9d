import { flushSync } from 'react-dom';
import type { ShownColumn } from '../columns/arrange';
import { useGrid } from '../grid/use-grid';
import type { Place } from '../grid/movement';
import { type TypeAt, useLedger } from './ledger-context';

interface Wishes {
  /** The columns in the order in which they are drawn. */
  shown: readonly ShownColumn[];
  keys: () => void;
  /** Opens what can be done with a column. */
  menu: (columnId: string) => void;
}

/** What keys and clicks do on the ledger: row 0 is the prior, the last the standing, column 0 the titles. */
export function useLedgerGrid({ shown, keys, menu }: Wishes) {
  const { differential, rows, canJudge, open } = useLedger();
  const standingRow = rows.length + 1;
  const columnOf = (place: Place) => shown[place.column - 1]?.column;

  const openAt = (place: Place, at: TypeAt | null) => {
    const column = columnOf(place);
    const finding = rows[place.row - 1];
    const told = column && differential.assessment ? column.index : null;
    if (place.row === 0)
      open(canJudge ? { kind: 'prior', at } : { kind: 'why', target: 'prior', column: column?.index ?? -1 });
    if (finding) open({ kind: 'row', findingId: finding.id, at });
    if (place.row === standingRow)
      open(told === null ? { kind: 'pooled' } : { kind: 'why', target: 'standing', column: told });
  };
  const columnAt = (place: Place): TypeAt | null => {
    const column = columnOf(place);
    return column ? { columnId: column.id } : null;
  };
  const { tableProps } = useGrid(
    { rows: standingRow + 1, columns: shown.length + 1 },
    {
      open: (place) => {
        openAt(place, columnAt(place));
      },
      type: (place) => {
        const at = columnAt(place);
        const finding = rows[place.row - 1];
        if (!canJudge || !at || place.row === standingRow || finding?.enteredInError) return;
        // At once: the field has to be there before the browser delivers the digit.
        flushSync(() => {
          openAt(place, at);
        });
      },
      why: (place) => {
        const target = place.row === 0 ? 'prior' : rows[place.row - 1]?.id;
        const column = columnOf(place);
        if (target === undefined || !column || !differential.assessment) openAt(place, null);
        else open({ kind: 'why', target, column: column.index });
      },
      menu: (place) => {
        const column = columnOf(place);
        if (column) menu(column.id);
      },
      escape: () => {
        open(null);
      },
      keys,
    },
  );
  return { standingRow, tableProps };
}
