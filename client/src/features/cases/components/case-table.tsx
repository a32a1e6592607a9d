import { useTable } from '@tanstack/react-table';
import type { CaseListItem } from '@weighhouse/shared/contracts/cases';
import { sortDirection } from './case-query';
import { columns, features, sortNames } from './case-columns';

interface Props {
  items: CaseListItem[];
  sort: string;
  onSort: (column: string) => void;
}

/**
 * The cases as ruled rows; on a phone each row is a card with its labels. The roles are written out because a browser
 * takes them away from a table whose rows are laid out as blocks.
 */
export function CaseTable({ items, sort, onSort }: Props) {
  const table = useTable({ features, columns, data: items, getRowId: (item) => item.id });
  return (
    <table className="case-table" role="table">
      <thead role="rowgroup">
        {table.getHeaderGroups().map((group) => (
          <tr key={group.id} role="row">
            {group.headers.map((header) => {
              const name = sortNames[header.column.id];
              const direction = name === undefined ? undefined : sortDirection(sort, name);
              return (
                <th
                  key={header.id}
                  role="columnheader"
                  scope="col"
                  aria-sort={direction}
                  className={`col-${header.column.id}`}
                >
                  {name === undefined ? (
                    <table.FlexRender header={header} />
                  ) : (
                    <button
                      type="button"
                      onClick={() => {
                        onSort(name);
                      }}
                    >
                      <table.FlexRender header={header} />
                      <span aria-hidden="true" className="sort-mark">
                        {direction === undefined ? '' : direction === 'ascending' ? '↑' : '↓'}
                      </span>
                    </button>
                  )}
                </th>
              );
            })}
          </tr>
        ))}
      </thead>
      <tbody role="rowgroup">
        {table.getRowModel().rows.map((row) => (
          <tr key={row.id} role="row">
            {row.getAllCells().map((cell) => (
              <td
                key={cell.id}
                role="cell"
                data-label={String(cell.column.columnDef.header)}
                className={`col-${cell.column.id}`}
              >
                <table.FlexRender cell={cell} />
              </td>
            ))}
          </tr>
        ))}
      </tbody>
    </table>
  );
}
