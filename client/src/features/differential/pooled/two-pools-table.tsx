import type { AssessmentView } from '@weighhouse/shared/contracts/assessment';
import { naturalFrequency } from '@weighhouse/shared/reasoning/natural-frequency';
import { useLedger } from '../ledger/ledger-context';
import { columnLabel } from '../model/columns';
import { leftOutRange } from '../model/range-words';

export const whole = (share: number | undefined) =>
  share === undefined ? '–' : String(naturalFrequency(share).outOf100);

/** Each column in the pool and on average, between what it moves when one is left out, and counted in full. */
export function TwoPoolsTable({
  assessment,
  inFull,
}: {
  assessment: AssessmentView;
  inFull: readonly number[] | null;
}) {
  const { columns } = useLedger();
  return (
    <table className="why-table">
      <thead>
        <tr>
          <th scope="col">Of 100</th>
          <th scope="col" className="why-number">
            Pool
          </th>
          <th scope="col" className="why-number">
            Average
          </th>
          <th scope="col" className="why-number">
            One left out
          </th>
          {inFull && (
            <th scope="col" className="why-number">
              In full
            </th>
          )}
        </tr>
      </thead>
      <tbody>
        {columns.map((column) => {
          const { low, high } = leftOutRange(assessment, column.index);
          return (
            <tr key={column.id}>
              <th scope="row">{columnLabel(column)}</th>
              <td className="figures why-number">{whole(assessment.standing[column.index])}</td>
              <td className="figures why-number">{whole(assessment.linearPool[column.index])}</td>
              <td className="figures why-number">
                {whole(low) === whole(high) ? whole(low) : `${whole(low)} to ${whole(high)}`}
              </td>
              {inFull && <td className="figures why-number">{whole(inFull[column.index])}</td>}
            </tr>
          );
        })}
      </tbody>
    </table>
  );
}
