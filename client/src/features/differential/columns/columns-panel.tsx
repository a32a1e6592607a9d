import { Button } from '@radix-ui/themes';
import { naturalFrequency } from '@weighhouse/shared/reasoning/natural-frequency';
import { counted } from '../../../lib/words';
import { useLedger } from '../ledger/ledger-context';
import { type Column, columnLabel } from '../model/columns';
import { SideHeading } from '../panels/side-panel';
import { fold, foldAll, pin, plainChoice, smallColumns, unfold, unpin } from './column-choice';
import { useColumnChoice } from './column-choice-context';

/** All columns in one list: which stay at the left, which are narrow strips. */
export function ColumnsPanel() {
  const { columns, differential } = useLedger();
  const { choice, choose } = useColumnChoice();
  const standing = differential.assessment?.standing ?? null;
  const small = smallColumns(columns, standing, choice);
  return (
    <>
      <SideHeading>Columns as you want them</SideHeading>
      <p className="side-about">
        Pinned ones stay beside the row titles, folded ones are narrow strips at the right. Only you see it
        so, in this browser. None of these is always there.
      </p>
      <div className="actions">
        {small.length > 0 && (
          <Button
            variant="outline"
            onClick={() => {
              choose((known) => foldAll(known, small));
            }}
          >
            {`Fold ${counted(small.length, 'column')} below 2 of 100`}
          </Button>
        )}
        <Button
          variant="outline"
          disabled={choice.pinned.length + choice.folded.length === 0}
          onClick={() => {
            choose(() => plainChoice);
          }}
        >
          All columns as they were
        </Button>
      </div>
      <ul className="column-list">
        {columns.map((column) => (
          <ColumnLine key={column.id} column={column} share={standing?.[column.index] ?? null} />
        ))}
      </ul>
    </>
  );
}

function ColumnLine({ column, share }: { column: Column; share: number | null }) {
  const { choice, choose } = useColumnChoice();
  const pinned = choice.pinned.includes(column.id);
  const folded = choice.folded.includes(column.id);
  return (
    <li>
      <span>
        {columnLabel(column)}
        {share !== null && <span className="small soft column-share">{naturalFrequency(share).words}</span>}
      </span>
      {column.none ? (
        <span className="small soft">always there</span>
      ) : (
        <span className="column-toggles">
          <label>
            <input
              type="checkbox"
              checked={pinned}
              aria-label={`Pin ${column.short}`}
              onChange={() => {
                choose((known) => (pinned ? unpin(known, column.id) : pin(known, column.id)));
              }}
            />
            pin
          </label>
          <label>
            <input
              type="checkbox"
              checked={folded}
              aria-label={`Fold ${column.short}`}
              onChange={() => {
                choose((known) => (folded ? unfold(known, column.id) : fold(known, column.id)));
              }}
            />
            fold
          </label>
        </span>
      )}
    </li>
  );
}
