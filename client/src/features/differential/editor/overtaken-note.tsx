import { BothTexts } from '../../../components/both-texts';
import { useLedger } from '../ledger/ledger-context';
import { columnLabel } from '../model/columns';
import { type Draft, textsOf } from '../typing/draft';
import type { useRowSaving } from './use-row-saving';

/** The same person saved this row somewhere else meanwhile: both, and the choice. */
export function OvertakenNote({ row }: { row: ReturnType<typeof useRowSaving> }) {
  return (
    <BothTexts
      what="your judgement of this row"
      mine={<Texts draft={row.draft} levels={row.levels} />}
      theirs={<Texts draft={row.saved} levels={row.levels} />}
      onKeepMine={() => void row.save(true)}
      onTakeTheirs={row.backToSaved}
    />
  );
}

function Texts({ draft, levels }: { draft: Draft; levels: number }) {
  const { columns } = useLedger();
  return (
    <ul className="both-lines">
      {columns.map((column) => {
        const texts = textsOf(draft, column.id, levels > 2 ? levels : 1).map((text) => text.trim());
        const words = texts.every((text) => text === '') ? 'blank' : texts.map((text) => text || 'blank').join(' / ');
        return (
          <li key={column.id}>
            {columnLabel(column)}: <span className="figures">{words}</span>
          </li>
        );
      })}
    </ul>
  );
}
