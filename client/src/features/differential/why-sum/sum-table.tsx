import type { AssessmentView } from '@weighhouse/shared/contracts/assessment';
import { useState } from 'react';
import { counted } from '../../../lib/words';
import { useLedger } from '../ledger/ledger-context';
import { type Column, columnLabel } from '../model/columns';
import type { Against } from './comparison';
import { SumLane } from './sum-lane';
import { FindingPush, SumEdge } from './sum-lines';
import { signed } from './sum-words';
import type { WhySum } from './why-sum';

/** Lines that are shown before the smaller ones are folded into one. */
const shownAtFirst = 12;

interface Props {
  sum: WhySum;
  assessment: AssessmentView;
  column: Column;
  against: Against;
}

/** The sum, line by line: the start, what each finding adds in order of size, the end. A table, drawn with beams. */
export function SumTable({ sum, assessment, column, against }: Props) {
  const { columns } = useLedger();
  const [all, setAll] = useState(false);
  const folds = !all && sum.pushes.length > shownAtFirst + 2;
  const shown = folds ? sum.pushes.slice(0, shownAtFirst) : sum.pushes;
  const rest = sum.pushes.slice(shown.length);
  const together = rest.reduce((total, { decibans }) => total + decibans, 0);
  const reach = Math.max(
    6,
    Math.abs(sum.start),
    ...sum.pushes.flatMap(({ decibans, soFar }) => [Math.abs(decibans), Math.abs(soFar)]),
  );
  const name = against === 'rest' ? 'everything else' : (columns[against]?.short ?? '');
  return (
    <table className="why-table sum-table">
      <caption className="aside-text">
        Why {columnLabel(column)} stands where it does against {name}, as a sum in decibans
      </caption>
      <thead>
        <tr>
          <th scope="col">What adds to the odds</th>
          <th scope="col" className="why-number">
            Push
          </th>
          <th scope="col" className="why-number">
            So far
          </th>
        </tr>
      </thead>
      <tbody>
        <SumEdge kind="start" value={sum.start} reach={reach} {...{ assessment, column, against }} />
        {shown.map((push, index) => (
          <FindingPush
            key={push.findingId}
            push={push}
            before={sum.pushes[index - 1]?.share ?? null}
            {...{ reach, assessment, column, against }}
          />
        ))}
        {rest.length > 0 && (
          <tr>
            <th scope="row">
              <button
                type="button"
                className="text-button"
                onClick={() => {
                  setAll(true);
                }}
              >
                Show {counted(rest.length, 'smaller one')}
              </button>
              <SumLane decibans={together} soFar={sum.end} reach={reach} kind="push" />
            </th>
            <td className="figures why-number">{signed(together)}</td>
            <td className="figures why-number">{signed(sum.end)}</td>
          </tr>
        )}
        <SumEdge kind="end" value={sum.end} reach={reach} {...{ assessment, column, against }} />
      </tbody>
    </table>
  );
}
