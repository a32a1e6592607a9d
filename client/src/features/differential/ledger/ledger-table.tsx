import { type CSSProperties, useState } from 'react';
import { flushSync } from 'react-dom';
import { useGrid } from '../grid/use-grid';
import type { Place } from '../grid/movement';
import { rowGroups } from '../model/rows';
import { FindingRow } from './finding-row';
import { HeaderRow } from './header-row';
import { KeysDialog } from './keys-dialog';
import { type TypeAt, useLedger } from './ledger-context';
import { PriorRow } from './prior-row';
import { StandingRow } from './standing-row';
import { useFrameHeight } from './use-frame-height';
import { useWidth } from './use-width';

/** Pixels: the title column, and what a column of figures needs at least. */
const titleWidth = 308;
const narrowTitleWidth = 280;
const leastTitleWidth = 200;
const goodColumnWidth = 92;
const leastColumnWidth = 84;

/** The titles give way to the figures where it is narrow. */
function titleFor(width: number, columns: number): number {
  if (width < 800) return leastTitleWidth;
  return (width - titleWidth) / columns < goodColumnWidth ? narrowTitleWidth : titleWidth;
}

/** The ledger as a grid: the prior, the findings, and where the panel stands. */
export function LedgerTable({ compact }: { compact: boolean }) {
  const { differential, columns, rows, canJudge, open } = useLedger();
  const [keysOpen, setKeysOpen] = useState(false);
  const [frame, width] = useWidth<HTMLDivElement>();
  const standingRow = rows.length + 1;
  const title = titleFor(width, columns.length);
  const scrolls = width > 0 && title + columns.length * leastColumnWidth > width;

  useFrameHeight(frame, scrolls);

  const openAt = (place: Place, at: TypeAt | null) => {
    if (place.row === 0)
      open(canJudge ? { kind: 'prior', at } : { kind: 'why', target: 'prior', column: place.column - 1 });
    const finding = rows[place.row - 1];
    if (finding) open({ kind: 'row', findingId: finding.id, at });
    if (place.row === standingRow)
      open(
        place.column > 0 && differential.assessment
          ? { kind: 'why', target: 'standing', column: place.column - 1 }
          : { kind: 'pooled' },
      );
  };
  const columnAt = (place: Place): TypeAt | null => {
    const column = columns[place.column - 1];
    return column ? { columnId: column.id } : null;
  };
  const grid = useGrid(
    { rows: standingRow + 1, columns: columns.length + 1 },
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
        if (target === undefined || place.column === 0 || !differential.assessment) openAt(place, null);
        else open({ kind: 'why', target, column: place.column - 1 });
      },
      escape: () => {
        open(null);
      },
      keys: () => {
        setKeysOpen(true);
      },
    },
  );

  const placeOfRow = new Map(rows.map((finding, index) => [finding.id, index + 1]));
  return (
    <div
      ref={frame}
      className="ledger-frame"
      data-scrolls={scrolls || undefined}
      data-compact={compact || undefined}
      style={
        {
          '--title-width': `${String(title)}px`,
          '--least-table': `${String(title + columns.length * leastColumnWidth)}px`,
        } as CSSProperties
      }
    >
      <table className="ledger" role="grid" aria-label="The differential" {...grid.tableProps}>
        <colgroup>
          <col className="ledger-title-column" />
          {columns.map((column) => (
            <col key={column.id} />
          ))}
        </colgroup>
        <thead>
          <HeaderRow />
        </thead>
        <tbody>
          <PriorRow />
        </tbody>
        {rowGroups(differential.findings).map((group) => (
          <tbody key={group.title}>
            <tr className="ledger-group">
              <th scope="rowgroup" colSpan={columns.length + 1}>
                <span>{group.title}</span>
              </th>
            </tr>
            {group.rows.map((finding) => (
              <FindingRow key={finding.id} finding={finding} row={placeOfRow.get(finding.id) ?? 0} />
            ))}
          </tbody>
        ))}
        <tfoot>
          <StandingRow row={standingRow} />
        </tfoot>
      </table>
      <KeysDialog open={keysOpen} onOpenChange={setKeysOpen} />
    </div>
  );
}
