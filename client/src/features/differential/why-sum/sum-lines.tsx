import type { AssessmentView } from '@weighhouse/shared/contracts/assessment';
import { naturalFrequency } from '@weighhouse/shared/reasoning/natural-frequency';
import { useLedger } from '../ledger/ledger-context';
import type { Column } from '../model/columns';
import { type Against, factorOf } from './comparison';
import { SumLane } from './sum-lane';
import { seenIn, becomesWords, columnWord, countsWords, oddsWords, oftenWords, signed } from './sum-words';
import type { Push } from './why-sum';

interface About {
  assessment: AssessmentView;
  column: Column;
  against: Against;
  reach: number;
}

/** What one finding adds. */
export function FindingPush({
  push,
  before,
  assessment,
  column,
  against,
  reach,
}: About & { push: Push; before: number | null }) {
  const { rows, columns, open } = useLedger();
  const finding = rows.find((row) => row.id === push.findingId);
  if (!finding) return null;
  const level = finding.observed ?? 1;
  const cell = (index: number) => assessment.pooledCells[finding.id]?.[index]?.[level];
  const other = against === 'rest' ? undefined : columns[against];
  const [here, there] = [cell(column.index), other && cell(other.index)];
  const often =
    other && here !== undefined && there !== undefined
      ? oftenWords(finding, [here, there], [column, other])
      : here === undefined
        ? ''
        : seenIn(finding, here, column);
  const from = before ?? assessment.pooledPrior[column.index] ?? 0;
  return (
    <tr>
      <th scope="row">
        <button
          type="button"
          className="text-button sum-title"
          onClick={() => {
            open({ kind: 'why', target: finding.id, column: column.index });
          }}
        >
          {finding.title}
        </button>
        <SumLane decibans={push.decibans} soFar={push.soFar} reach={reach} kind="push" />
        <span className="sum-words">
          {often} {countsWords(push.decibans)}. {push.share !== null && becomesWords(from, push.share)}
        </span>
      </th>
      <td className="figures why-number">{signed(push.decibans)}</td>
      <td className="figures why-number">{signed(push.soFar)}</td>
    </tr>
  );
}

/** The start or the end of the sum: natural frequency, and odds in words. */
export function SumEdge({
  kind,
  value,
  assessment,
  column,
  against,
  reach,
}: About & { kind: 'start' | 'end'; value: number }) {
  const { columns } = useLedger();
  const shares = kind === 'start' ? assessment.pooledPrior : assessment.standing;
  const words = (index: number) => naturalFrequency(shares[index] ?? 0).words;
  const other = against === 'rest' ? undefined : columns[against];
  const held = other
    ? `${words(column.index)} for ${columnWord(column)}, ${words(other.index)} for ${columnWord(other)}`
    : `${words(column.index)} for ${columnWord(column)}`;
  return (
    <tr data-line={kind}>
      <th scope="row">
        <span className="sum-title">
          {kind === 'start' ? 'Before any finding' : 'Where the panel stands'}
        </span>
        <SumLane decibans={value} soFar={value} reach={reach} kind={kind} />
        <span className="sum-words">
          {held}: odds {oddsWords(factorOf(value))}.
        </span>
      </th>
      <td className="figures why-number">{kind === 'start' ? signed(value) : ''}</td>
      <td className="figures why-number">{signed(value)}</td>
    </tr>
  );
}
