import { naturalFrequency } from '@weighhouse/shared/reasoning/natural-frequency';
import { useMedia, usePhone } from '../ledger/use-media';
import { type Column, columnLabel } from '../model/columns';
import { withSoftHyphens } from '../model/soft-hyphens';
import { ResultBar } from './result-bar';
import { largestOf, shownColumns } from './shown-columns';
import type { ResultView, TestView } from './tests-view';

interface Props {
  test: TestView;
  columns: Column[];
  now: readonly number[];
}

/** Each possible result, how likely it is, and where the panel would stand: a table, on a phone one list for each. */
export function Results({ test, columns, now }: Props) {
  const phone = usePhone();
  const narrow = useMedia('(max-width: 900px)');
  const { shown, rest } = shownColumns(columns, test, now, narrow ? 4 : undefined);
  const lines = test.results.map((result) => ({ result, shown, rest, now }));
  return phone ? (
    <ul className="results-list">
      {lines.map((line) => (
        <ResultList key={line.result.level} {...line} />
      ))}
    </ul>
  ) : (
    <table className="results">
      <thead>
        <tr>
          <th scope="col">Result</th>
          <th scope="col">How likely</th>
          {shown.map((column) => (
            <th key={column.id} scope="col" title={column.name}>
              <span className="results-letter">{column.letter}</span>
              {withSoftHyphens(column.short)}
            </th>
          ))}
          {rest.length > 0 && <th scope="col">{String(rest.length)} others</th>}
        </tr>
      </thead>
      <tbody>
        {lines.map((line) => (
          <ResultRow key={line.result.level} {...line} />
        ))}
      </tbody>
    </table>
  );
}

interface LineProps {
  result: ResultView;
  shown: Column[];
  rest: Column[];
  now: readonly number[];
}

const shareOf = (result: ResultView, column: Column) => result.standing[column.index] ?? 0;

function ResultRow({ result, shown, rest, now }: LineProps) {
  return (
    <tr>
      <th scope="row">{result.name}</th>
      <td className="figures result-likely">{naturalFrequency(result.p).words}</td>
      {shown.map((column) => {
        const share = shareOf(result, column);
        const first = result.leader === column.index;
        return (
          <td key={column.id} data-first={first || undefined}>
            <span className="figures">{naturalFrequency(share).outOf100}</span>
            {first && <span className="result-first">{result.takesFirst ? 'now first' : 'first'}</span>}
            <ResultBar share={share} now={now[column.index] ?? null} none={column.none} />
          </td>
        );
      })}
      {rest.length > 0 && <td className="result-rest">{restWords(rest, result.standing)}</td>}
    </tr>
  );
}

function ResultList({ result, shown, rest, now }: LineProps) {
  return (
    <li>
      <h4>
        {result.name}: <span className="figures">{naturalFrequency(result.p).words}</span>
      </h4>
      <ul className="result-columns">
        {shown.map((column) => (
          <li key={column.id}>
            <span className="cell-list-name">
              {columnLabel(column)}
              {result.leader === column.index && (
                <span className="result-first">{result.takesFirst ? 'now first' : 'first'}</span>
              )}
            </span>
            <ResultBar share={shareOf(result, column)} now={now[column.index] ?? null} none={column.none} />
            <span className="figures">{naturalFrequency(shareOf(result, column)).outOf100}</span>
          </li>
        ))}
      </ul>
      {rest.length > 0 && (
        <p className="small soft">
          {String(rest.length)} others: {restWords(rest, result.standing)}
        </p>
      )}
    </li>
  );
}

const restWords = (rest: readonly Column[], standing: readonly number[]) => {
  const { outOf100 } = naturalFrequency(largestOf(rest, standing));
  return typeof outOf100 === 'string' ? `each ${outOf100}` : `each at most ${String(outOf100)}`;
};
