import { useState } from 'react';
import type { ShownColumn } from '../columns/arrange';
import { keepingRowCells } from '../model/row-cells';
import { rowGroups } from '../model/rows';
import { triedColumns, triedOnRow } from '../trial/trial-changes';
import { FindingRow } from './finding-row';
import { settlingMost } from '../next-test/test-words';
import { useLedger } from './ledger-context';

/** The findings in their groups. */
export function FindingRows({ shown }: { shown: readonly ShownColumn[] }) {
  const { differential, columns, rows, panel, unsaved, open, reading } = useLedger();
  const [cellsOf] = useState(keepingRowCells);
  const cells = cellsOf(differential, rows, columns.length);
  const placeOf = new Map(rows.map((finding, index) => [finding.id, index + 1]));
  const agenda = new Set(differential.agenda.map((item) => item.findingId));
  const settling = settlingMost(differential);
  const selected =
    panel?.kind === 'row' || panel?.kind === 'trial'
      ? panel.findingId
      : panel?.kind === 'why'
        ? panel.target
        : null;
  return rowGroups(differential.findings).map((group) => (
    <tbody key={group.title}>
      <tr className="ledger-group">
        <th scope="rowgroup" colSpan={columns.length + 1}>
          <span>{group.title}</span>
        </th>
      </tr>
      {group.rows.map((finding) => (
        <FindingRow
          key={finding.id}
          finding={finding}
          row={placeOf.get(finding.id) ?? 0}
          shown={shown}
          cells={cells.get(finding.id) ?? []}
          selected={selected === finding.id}
          unsaved={unsaved.has(finding.id)}
          tried={triedOnRow(reading.trial, finding)}
          triedColumns={triedColumns(reading.trial, finding.id)}
          onAgenda={agenda.has(finding.id)}
          settlesMost={settling === finding.id}
          why={differential.assessment ? open : null}
        />
      ))}
    </tbody>
  ));
}
