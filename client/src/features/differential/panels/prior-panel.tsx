import { naturalFrequency } from '@weighhouse/shared/reasoning/natural-frequency';
import { useState } from 'react';
import { PriorForm } from '../editor/prior-form';
import { useLedger } from '../ledger/ledger-context';
import { columnLabel } from '../model/columns';
import { SideHeading } from './side-panel';

/** One's own prior, again: after a change of the candidates, or because one thinks otherwise now. */
export function PriorPanel() {
  const { saved: differential, columns } = useLedger();
  const [saved, setSaved] = useState(false);
  const { mine } = differential;
  const given = mine?.prior && mine.priorInForce ? mine.prior : null;
  return (
    <>
      <SideHeading>Before any finding</SideHeading>
      {mine?.prior && !mine.priorInForce && (
        <p className="note">
          The candidates have changed since you gave your prior. Until you give it again it is not pooled.
          Your likelihoods of the other columns stay.
        </p>
      )}
      {given && (
        <p className="soft">
          {saved ? 'Saved. ' : ''}You gave:{' '}
          {columns
            .map(
              (column) =>
                `${columnLabel(column)} ${naturalFrequency((given.outOf100[column.index] ?? 0) / 100).words}`,
            )
            .join(', ')}
          . To change it, give all shares anew.
        </p>
      )}
      <PriorForm
        onSaved={() => {
          setSaved(true);
        }}
      />
    </>
  );
}
