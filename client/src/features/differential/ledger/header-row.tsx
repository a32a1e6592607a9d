import { withSoftHyphens } from '../model/soft-hyphens';
import { AssumptionSwitch } from '../reading/assumption-switch';
import { useLedger } from './ledger-context';

/** The candidates as columns. */
export function HeaderRow() {
  const { columns } = useLedger();
  return (
    <tr>
      <th scope="col" className="ledger-assumption">
        <AssumptionSwitch />
      </th>
      {columns.map((column) => (
        <th key={column.id} scope="col" className="ledger-candidate" title={column.name}>
          <span className="ledger-letter">{column.letter}</span>
          <span className="aside-text">{column.name}</span>
          <span className="ledger-candidate-name" aria-hidden="true">
            {withSoftHyphens(column.short)}
          </span>
          {column.mustNotMiss && <span className="ledger-must">must not miss</span>}
        </th>
      ))}
    </tr>
  );
}
