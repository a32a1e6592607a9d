import { type CSSProperties, useMemo, useState } from 'react';
import { type Arrangement, arrange, foldedWidth, leastColumnWidth } from '../columns/arrange';
import { useColumnChoice } from '../columns/column-choice-context';
import { FindingRows } from './finding-rows';
import { HeaderRow } from './header-row';
import { KeysDialog } from './keys-dialog';
import { useLedger } from './ledger-context';
import { PriorRow } from './prior-row';
import { StandingRow } from './standing-row';
import { useFrameHeight } from './use-frame-height';
import { useLedgerGrid } from './use-ledger-grid';
import { useWidth } from './use-width';

/** The ledger as a grid: the prior, the findings, and where the panel stands. */
export function LedgerTable({ compact }: { compact: boolean }) {
  const { columns } = useLedger();
  const { choice } = useColumnChoice();
  const [keysOpen, setKeysOpen] = useState(false);
  const [menu, setMenu] = useState<string | null>(null);
  const [frame, width] = useWidth<HTMLDivElement>();
  const arrangement = useMemo(() => arrange(columns, choice, width), [columns, choice, width]);
  const { shown, scrolls } = arrangement;
  useFrameHeight(frame, scrolls);
  const grid = useLedgerGrid({
    shown,
    keys: () => {
      setKeysOpen(true);
    },
    menu: setMenu,
  });
  return (
    <div
      ref={frame}
      className="ledger-frame"
      data-scrolls={scrolls || undefined}
      data-compact={compact || undefined}
      style={measures(arrangement)}
    >
      <table className="ledger" role="grid" aria-label="The differential" {...grid.tableProps}>
        <colgroup>
          <col className="ledger-title-column" />
          {shown.map(({ column, folded }) => (
            <col key={column.id} data-folded={folded || undefined} style={columnWidth(folded, scrolls)} />
          ))}
        </colgroup>
        <thead>
          <HeaderRow shown={shown} menu={menu} onMenu={setMenu} />
        </thead>
        <tbody>
          <PriorRow shown={shown} />
        </tbody>
        <FindingRows shown={shown} />
        <tfoot>
          <StandingRow row={grid.standingRow} shown={shown} />
        </tfoot>
      </table>
      <KeysDialog open={keysOpen} onOpenChange={setKeysOpen} />
    </div>
  );
}

function measures({ title, least, stuckLeft, stuckRight }: Arrangement) {
  return {
    '--title-width': `${String(title)}px`,
    '--least-table': `${String(least)}px`,
    '--stuck-left': `${String(stuckLeft)}px`,
    '--stuck-right': `${String(stuckRight)}px`,
  } as CSSProperties;
}

/** Where the ledger scrolls every width is said, so that what stays at an edge stays in its place. */
const columnWidth = (folded: boolean, scrolls: boolean) =>
  folded ? { width: foldedWidth } : scrolls ? { width: leastColumnWidth } : undefined;
