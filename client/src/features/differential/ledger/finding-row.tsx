import type { Finding } from '@weighhouse/shared/contracts/findings';
import { memo } from 'react';
import { useFormat } from '../../../lib/use-format';
import { dayWords } from '../model/day-words';
import { findingLine } from '../model/finding-words';
import { FindingCell } from './finding-cell';
import { useLedger } from './ledger-context';

/** One finding across the candidates. */
export const FindingRow = memo(function FindingRow({ finding, row }: { finding: Finding; row: number }) {
  const { columns, panel, unsaved } = useLedger();
  const format = useFormat();
  const selected =
    (panel?.kind === 'row' && panel.findingId === finding.id) ||
    (panel?.kind === 'why' && panel.target === finding.id);
  const state = finding.enteredInError ? 'error' : finding.observed === null ? 'pending' : 'observed';
  return (
    <tr className="ledger-row" data-state={state} aria-selected={selected}>
      <th scope="row" className="ledger-title" data-row={row} data-column={0} tabIndex={-1}>
        <span className="ledger-name">{finding.title}</span>
        <span className="ledger-line">
          {unsaved.has(finding.id) && <b className="ledger-unsaved">Typed, not saved.</b>}
          {findingLine(finding, dayWords(format))}
        </span>
      </th>
      {columns.map((column) => (
        <FindingCell key={column.id} finding={finding} column={column} row={row} />
      ))}
    </tr>
  );
});
