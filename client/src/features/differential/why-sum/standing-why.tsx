import { naturalFrequency } from '@weighhouse/shared/reasoning/natural-frequency';
import { useState } from 'react';
import { HundredMarks } from '../../../components/marks/hundred-marks';
import { capital } from '../../../lib/words';
import { useLedger } from '../ledger/ledger-context';
import { type Column, columnLabel } from '../model/columns';
import { rangeSentence } from '../model/range-words';
import { SideHeading } from '../panels/side-panel';
import { type Against, decibansOf, oddsOf, runnerUp } from './comparison';
import { SumTable } from './sum-table';
import { signed } from './sum-words';
import { useInFull } from './use-in-full';
import { usePanelInForce } from './use-panel-in-force';
import { useWhySum } from './use-why-sum';
import type { WhySum } from './why-sum';
import './why-sum.css';

/** Why the panel stands where it does on one candidate: a sum that a person can follow, and that adds up. */
export function StandingWhy({ column }: { column: Column }) {
  const { differential, columns, open } = useLedger();
  const { panel, oneCause } = usePanelInForce();
  const { assessment } = differential;
  const [chosen, setChosen] = useState<Against | null>(null);
  const inFull = useInFull(panel);
  if (!assessment) return <p className="soft">There is no pooled number here.</p>;
  const share = assessment.standing[column.index] ?? 0;
  const first = oneCause ? runnerUp(assessment.standing, column.index) : 'rest';
  const against = chosen === null || chosen === column.index ? first : chosen;
  return (
    <>
      <SideHeading>
        Why {columnLabel(column)} stands at {naturalFrequency(share).words}
      </SideHeading>
      <p className="side-about">
        {capital(rangeSentence(assessment, column.index, inFull?.[column.index] ?? null))}.
      </p>
      <Hundreds column={column} start={assessment.pooledPrior[column.index] ?? 0} end={share} />
      <label className="sum-against">
        Held against
        <select
          className="select-box"
          value={String(against)}
          onChange={(event) => {
            const { value } = event.target;
            setChosen(value === 'rest' ? 'rest' : Number(value));
          }}
        >
          {columns
            .filter((one) => one.index !== column.index)
            .map((one) => (
              <option key={one.id} value={one.index}>
                {columnLabel(one)}
              </option>
            ))}
          <option value="rest">{oneCause ? 'Everything else' : 'Not having it'}</option>
        </select>
      </label>
      <Sum key={`${String(column.index)} ${String(against)}`} column={column} against={against} />
      <p>
        <button
          type="button"
          className="text-button"
          onClick={() => {
            open({ kind: 'pooled' });
          }}
        >
          How it was pooled
        </button>
      </p>
    </>
  );
}

function Hundreds({ column, start, end }: { column: Column; start: number; end: number }) {
  const picture = (share: number, when: string) => {
    const { outOf100, words } = naturalFrequency(share);
    return (
      <figure>
        <HundredMarks outOf100={outOf100} label={`${words}, ${when}`} none={column.none} />
        <figcaption>
          <b className="figures">{words}</b>
          <br />
          <span className="soft">{when}</span>
        </figcaption>
      </figure>
    );
  };
  return (
    <div className="hundreds">
      {picture(start, 'before any finding')}
      {picture(end, 'where the panel stands')}
    </div>
  );
}

function Sum({ column, against }: { column: Column; against: Against }) {
  const { differential } = useLedger();
  const { panel, oneCause } = usePanelInForce();
  const { assessment } = differential;
  if (!assessment) return null;
  return <Added {...{ assessment, panel, oneCause, column, against }} />;
}

type AddedProps = ReturnType<typeof usePanelInForce> & {
  assessment: NonNullable<ReturnType<typeof useLedger>['differential']['assessment']>;
  column: Column;
  against: Against;
};

function Added({ assessment, panel, oneCause, column, against }: AddedProps) {
  const state = useWhySum(assessment, panel, { column: column.index, against, oneCause });
  if (!('sum' in state))
    return (
      <p className="soft" role="status">
        Adding up: {state.done} of {state.of} steps.
      </p>
    );
  const { sum } = state;
  return (
    <>
      <p className="small soft">{howWords(sum, oneCause)}</p>
      <SumTable {...{ sum, assessment, column, against }} />
      <p className="small" data-adds-up={addsUp(sum, assessment.standing, column.index, against, oneCause)}>
        {totalWords(sum, assessment.standing, column.index, against, oneCause)}
      </p>
      <p className="small soft">
        A beam to the right counts for, to the left against.{' '}
        <span className="sum-key-line" aria-hidden="true" />
        The black line is the sum so far. In decibans: 3 make the odds about twice as long, 10 ten times as
        long. Reliability, overlap and tempering make a finding count less than it is seen.
      </p>
    </>
  );
}

function howWords(sum: WhySum, oneCause: boolean): string {
  if (!sum.inThisOrder)
    return 'Each finding pushes by how much more often it is seen in the one than in the other. The order makes no difference: the largest push stands first.';
  return oneCause
    ? 'Against everything else a push depends on what is counted before it, so the pushes hold in this order: what matters most stands first.'
    : 'A patient may have several of these at once, so one column alone does not add up. Each push is how the odds change when this finding is counted after those above, in this order: what matters most stands first.';
}

const endOf = (standing: readonly number[], column: number, against: Against, oneCause: boolean) =>
  decibansOf(oddsOf(standing, column, against, oneCause));

/** Within a twentieth of a deciban, which no figure on the screen would show. */
function addsUp(
  sum: WhySum,
  standing: readonly number[],
  column: number,
  against: Against,
  oneCause: boolean,
) {
  return Math.abs(sum.end - endOf(standing, column, against, oneCause)) < 0.05;
}

function totalWords(
  sum: WhySum,
  standing: readonly number[],
  column: number,
  against: Against,
  oneCause: boolean,
): string {
  const pushes = sum.end - sum.start;
  const sentence = `Start ${signed(sum.start)} and all findings ${signed(pushes)} make ${signed(sum.end)} decibans`;
  return addsUp(sum, standing, column, against, oneCause)
    ? `${sentence}, which is where the panel stands (to the nearest tenth).`
    : `${sentence}. The standing has just moved; the findings follow.`;
}
