import { Button, TextArea } from '@radix-ui/themes';
import { useId } from 'react';
import { SaveState } from '../../../components/save-state';
import { useLedger } from '../ledger/ledger-context';
import { columnLabel } from '../model/columns';
import { textsOf } from '../typing/draft';
import { numberText } from '../typing/parse-number';
import { restWords } from '../typing/sum';
import { ChangedMeanwhile } from './changed-meanwhile';
import { NumberField } from './number-field';
import { askedName } from './likelihood-line';
import { usePriorSaving } from './use-prior-saving';

/** Asks for a prior: shares of 100 for the candidates, before the findings. */
export function PriorForm({ onSaved }: { onSaved?: () => void }) {
  const { columns } = useLedger();
  const prior = usePriorSaving();
  const id = useId();
  return (
    <form
      className="prior-form"
      noValidate
      onSubmit={(event) => {
        event.preventDefault();
        void prior.save().then((saved) => {
          if (saved) onSaved?.();
        });
      }}
    >
      <p className="row-question">
        Of 100 patients of this age and sex referred to such a panel, before the findings below: how many
        would have …
      </p>
      <div className="likelihoods">
        {columns.map((column) => {
          const fault = prior.shares.faults.find((one) => one.index === column.index);
          return (
            <div key={column.id} className="prior-line">
              <span title={column.name} aria-hidden="true">
                {columnLabel(column)}
              </span>
              <NumberField
                label={`How many of 100 would have ${askedName(column)}?`}
                value={textsOf(prior.draft, column.id, 1)[0] ?? ''}
                onChange={(text) => {
                  prior.typeText(column.id, text);
                }}
                fault={fault !== undefined}
                describedBy={`${id}rest${fault ? ` ${id}${column.id}` : ''}`}
                place={column.id}
              />
              {fault && (
                <p id={`${id}${column.id}`} className="field-fault">
                  {columnLabel(column)} {fault.message}.
                </p>
              )}
            </div>
          );
        })}
      </div>
      <p id={`${id}rest`} className="prior-rest" data-over={prior.shares.rest < 0 || undefined} role="status">
        {restWords(prior.shares)}
      </p>
      <label className="reason-label" htmlFor={`${id}reason`}>
        Reason <span className="soft">(may be left out)</span>
      </label>
      <TextArea
        id={`${id}reason`}
        rows={2}
        maxLength={4000}
        value={prior.draft.reason}
        onChange={(event) => {
          prior.typeReason(event.target.value);
        }}
      />
      {prior.tried && !prior.shares.complete && (
        <p className="field-fault" role="alert">
          Not saved: every candidate needs a share of 0.1 or more, and together they must be 100.
          {prior.shares.faults.length === 0 && prior.shares.rest !== 0
            ? ` Now they are ${numberText(100 - prior.shares.rest)}.`
            : ''}
        </p>
      )}
      <ChangedMeanwhile error={prior.error} draft={prior.draft.cells.size > 0 ? prior.draft : null} />
      <div className="actions editor-actions">
        <Button type="submit" loading={prior.busy}>
          Save prior
        </Button>
        <SaveState saving={prior.saving} />
      </div>
    </form>
  );
}
