import type { ShownColumn } from '../columns/arrange';
import { AssumptionSwitch } from '../reading/assumption-switch';
import { CandidateHeader } from './candidate-header';

interface Props {
  shown: readonly ShownColumn[];
  /** The id of the column whose menu is open. */
  menu: string | null;
  onMenu: (id: string | null) => void;
}

/** The candidates as columns. */
export function HeaderRow({ shown, menu, onMenu }: Props) {
  return (
    <tr>
      <th scope="col" className="ledger-assumption">
        <AssumptionSwitch />
      </th>
      {shown.map((one) => (
        <CandidateHeader
          key={one.column.id}
          of={one}
          menuOpen={menu === one.column.id}
          onMenu={(open) => {
            onMenu(open ? one.column.id : null);
          }}
        />
      ))}
    </tr>
  );
}
