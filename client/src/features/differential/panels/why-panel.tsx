import { naturalFrequency } from '@weighhouse/shared/reasoning/natural-frequency';
import { useLedger } from '../ledger/ledger-context';
import { decibanWords, figureWords, shownWords } from '../model/cell-words';
import { cellView } from '../model/cells';
import { columnLabel } from '../model/columns';
import { stateWords } from '../model/finding-words';
import { whyCell, type WhyLine, whyPrior } from '../model/why';
import { StandingWhy } from '../why-sum/standing-why';
import { SideHeading } from './side-panel';
import { useWeights } from './use-weights';

/** How one number of the ledger came about: who, how much each counts, each one's number, and the pool. */
export function WhyPanel({ target, column: index }: { target: string; column: number }) {
  const { differential, columns, open, rows } = useLedger();
  const { weightOf } = useWeights();
  const column = columns[index];
  const { assessment } = differential;
  if (!column || !assessment) return <p className="soft">There is no pooled number here.</p>;
  if (target === 'standing') return <StandingWhy key={column.id} column={column} />;
  const finding = rows.find((row) => row.id === target);
  const pooled = (
    <button
      type="button"
      className="text-button"
      onClick={() => {
        open({ kind: 'pooled' });
      }}
    >
      How it was pooled
    </button>
  );
  if (!finding) {
    const share = assessment.pooledPrior[index];
    return (
      <>
        <SideHeading>Why {columnLabel(column)} starts where it does</SideHeading>
        <p className="side-about">
          {assessment.priorGiven && share !== undefined
            ? `Pooled: ${naturalFrequency(share).words}, before any finding.`
            : 'Nobody gave a prior, so every column starts alike.'}
        </p>
        <WhyTable lines={whyPrior(differential, index, weightOf)} shown="start here" />
        <p>{pooled}</p>
      </>
    );
  }
  const cell = cellView(differential, finding, index);
  return (
    <>
      <SideHeading>
        Why {columnLabel(column)}, {finding.title}
      </SideHeading>
      <p className="side-about">
        {stateWords(finding)}.{' '}
        {cell.figure ? `Pooled: ${figureWords(finding, cell.figure)}.` : 'Nobody judged this row.'}{' '}
        {cell.unjudged === 'cell' &&
          'Nobody judged this cell: it takes the average of the judged ones of its row, so that it counts neither way among them. '}
        {cell.decibans !== null &&
          `Against the average of the row it ${decibanWords(cell.decibans)} here, after reliability, overlap and tempering.`}
      </p>
      <WhyTable
        lines={whyCell(differential, finding, index, weightOf)}
        shown={shownWords(finding, cell.figure?.level ?? finding.observed ?? 1)}
      />
      <p>
        <button
          type="button"
          className="text-button"
          onClick={() => {
            open({ kind: 'row', findingId: finding.id, at: null });
          }}
        >
          The whole row
        </button>
      </p>
      <p>{pooled}</p>
    </>
  );
}

const exposureWords = {
  seldom: 'seldom, counts a quarter',
  sometimes: 'sometimes, counts half',
  often: 'often, counts in full',
};

function WhyTable({ lines, shown }: { lines: WhyLine[]; shown: string }) {
  return (
    <table className="why-table">
      <thead>
        <tr>
          <th scope="col">Who</th>
          <th scope="col" className="why-number">
            Of 100 {shown}
          </th>
          <th scope="col" className="why-number">
            Counts
          </th>
        </tr>
      </thead>
      <tbody>
        {lines.map((line) => (
          <tr key={line.voice.key} data-you={line.voice.you || undefined}>
            <th scope="row">
              {line.voice.name}
              {line.voice.specialty !== null && line.voice.specialty !== '' && (
                <span className="soft">, {line.voice.specialty}</span>
              )}
              {line.exposure !== null && (
                <span className="small soft why-more">Sees it {exposureWords[line.exposure]}</span>
              )}
              {line.reason !== null && line.reason !== '' && (
                <span className="small why-more">“{line.reason}”</span>
              )}
            </th>
            <td className="figures why-number">
              {line.share === null ? 'blank' : naturalFrequency(line.share).outOf100}
            </td>
            <td className="figures why-number">
              {line.counts === null ? '–' : line.counts.toFixed(2).replace(/\.?0+$/, '')}
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
