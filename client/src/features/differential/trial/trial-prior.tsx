import { useState } from 'react';
import { NumberField } from '../editor/number-field';
import { askedName } from '../editor/likelihood-line';
import { useLedger } from '../ledger/ledger-context';
import { columnLabel } from '../model/columns';
import { numberText } from '../typing/parse-number';
import { readShares, restWords } from '../typing/sum';

/** Tries another prior of one's own; it counts once its shares sum to 100. */
export function TrialPrior() {
  const { reading, saved, columns } = useLedger();
  const known = saved.mine?.prior && saved.mine.priorInForce ? saved.mine.prior.outOf100 : null;
  const tried = reading.trial.prior;
  const [typed, setTyped] = useState<readonly string[] | null>(null);
  // What sums to 100 is in the trial, and is shown as it stands there: it may be taken back in the list.
  const unfinished = typed !== null && !readShares(typed).complete;
  const texts = columns.map((column) => {
    const share = tried ? tried[column.id] : known?.[column.index];
    if (unfinished) return typed[column.index] ?? '';
    return share === undefined ? '' : numberText(share);
  });
  const shares = readShares(texts);
  return (
    <form
      className="prior-form"
      onSubmit={(event) => {
        event.preventDefault();
      }}
    >
      <div className="likelihoods">
        {columns.map((column) => (
          <div key={column.id} className="prior-line">
            <span aria-hidden="true">{columnLabel(column)}</span>
            <NumberField
              label={`Tried: how many of 100 would have ${askedName(column)}?`}
              value={texts[column.index] ?? ''}
              fault={shares.faults.some(({ index }) => index === column.index)}
              place={column.id}
              onChange={(text) => {
                const next = texts.map((one, index) => (index === column.index ? text : one));
                setTyped(next);
                const read = readShares(next);
                if (!read.complete) return;
                const same = known?.every((share, index) => read.values[index] === share) ?? false;
                const entries = columns.map((one) => [one.id, read.values[one.index] ?? 0] as const);
                reading.tryOut({ ...reading.trial, prior: same ? null : Object.fromEntries(entries) });
              }}
            />
          </div>
        ))}
      </div>
      <p className="prior-rest" data-over={shares.rest < 0 || undefined} role="status">
        {restWords(shares)}
        {shares.complete ? '' : '. Until then it does not count'}.
      </p>
    </form>
  );
}
