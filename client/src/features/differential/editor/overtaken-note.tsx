import { Button } from '@radix-ui/themes';
import { useLedger } from '../ledger/ledger-context';
import { columnLabel } from '../model/columns';
import { type Draft, textsOf } from '../typing/draft';
import type { useRowSaving } from './use-row-saving';

/** The same person saved this row somewhere else meanwhile: both, and the choice. */
export function OvertakenNote({ row }: { row: ReturnType<typeof useRowSaving> }) {
  return (
    <section className="both-texts" role="alert" aria-label="Saved somewhere else meanwhile">
      <p className="failure-title">
        You saved this row somewhere else while you were typing here. Choose what stays.
      </p>
      <div className="both-columns">
        <div>
          <h3>Typed here, not saved</h3>
          <Texts draft={row.draft} levels={row.levels} />
          <Button type="button" onClick={() => void row.save(true)}>
            Save what is typed
          </Button>
        </div>
        <div>
          <h3>Saved meanwhile</h3>
          <Texts draft={row.saved} levels={row.levels} />
          <Button type="button" variant="outline" onClick={row.backToSaved}>
            Take what is saved
          </Button>
        </div>
      </div>
    </section>
  );
}

function Texts({ draft, levels }: { draft: Draft; levels: number }) {
  const { columns } = useLedger();
  return (
    <ul className="both-lines">
      {columns.map((column) => {
        const texts = textsOf(draft, column.id, levels > 2 ? levels : 1).map((text) => text.trim());
        const words = texts.every((text) => text === '')
          ? 'blank'
          : texts.map((text) => text || 'blank').join(' / ');
        return (
          <li key={column.id}>
            {columnLabel(column)}: <span className="figures">{words}</span>
          </li>
        );
      })}
    </ul>
  );
}
