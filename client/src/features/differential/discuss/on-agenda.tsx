import type { Finding } from '@weighhouse/shared/contracts/findings';
import { useLedger } from '../ledger/ledger-context';
import './discuss.css';

/** In a row's own panel: what the chair wants discussed about it. */
export function OnAgenda({ finding }: { finding: Finding }) {
  const { differential } = useLedger();
  const item = differential.agenda.find((one) => one.findingId === finding.id);
  if (!item) return null;
  return (
    <p className="discuss-note">
      <b>Discuss first.</b> {item.note} <span className="small soft">{item.addedBy}</span>
    </p>
  );
}
