import { useSearchParams } from 'react-router-dom';
import { FindingForm } from '../evidence/finding-form';
import { useLedger } from '../ledger/ledger-context';
import { SideHeading } from './side-panel';

/** Adds a finding, or changes one. */
export function FindingPanel({ findingId }: { findingId: string | null }) {
  const { saved: differential, open } = useLedger();
  const [params] = useSearchParams();
  const finding = differential.findings.find((one) => one.id === findingId) ?? null;
  const page = Number(params.get('page'));
  return (
    <>
      <SideHeading>{finding ? 'Change this finding' : 'Add a finding'}</SideHeading>
      <FindingForm
        caseId={differential.caseId}
        finding={finding}
        groups={differential.settings.groups}
        fromReport={finding ? null : { reportId: params.get('report'), page: page >= 1 ? page : null }}
        onDone={(saved) => {
          open({ kind: 'row', findingId: saved, at: null });
        }}
        onCancel={() => {
          open(finding ? { kind: 'row', findingId: finding.id, at: null } : null);
        }}
      />
    </>
  );
}
