import type { Finding } from '@weighhouse/shared/contracts/findings';
import { naturalFrequency } from '@weighhouse/shared/reasoning/natural-frequency';
import { useLedger } from '../ledger/ledger-context';
import { columnLabel } from '../model/columns';
import { voiceName } from '../model/people';

/** On which candidate the panel is furthest apart in this row, and who. */
export function ApartNote({ finding }: { finding: Finding }) {
  const { differential, columns } = useLedger();
  const apart = differential.sealed ? null : (differential.assessment?.rows[finding.id]?.apart ?? null);
  const column = apart === null ? undefined : columns[apart.column];
  if (!apart || !column) return null;
  const pole = ({ contributor, p }: typeof apart.low) =>
    `${voiceName(differential, contributor)} ${String(naturalFrequency(p).outOf100)}`;
  return (
    <div className="apart-note">
      <p className="small soft">
        Furthest apart on this row: {columnLabel(column)}, {naturalFrequency(apart.low.p).outOf100} to{' '}
        {naturalFrequency(apart.high.p).words}.
      </p>
      <p>
        {pole(apart.low)}, {pole(apart.high)}.
      </p>
      <Reasons finding={finding} keys={[apart.low.contributor, apart.high.contributor]} />
    </div>
  );
}

/** What the two said about it. */
function Reasons({ finding, keys }: { finding: Finding; keys: string[] }) {
  const { differential } = useLedger();
  const said = keys.flatMap((key) => {
    const person =
      differential.mine?.key === key
        ? differential.mine
        : differential.others?.find((other) => other.key === key);
    const reason = person?.findings.find((row) => row.findingId === finding.id)?.reason ?? null;
    return reason === null || reason === '' ? [] : [{ key, reason }];
  });
  return said.map(({ key, reason }) => (
    <p key={key}>
      {voiceName(differential, key)}: “{reason}”
    </p>
  ));
}
