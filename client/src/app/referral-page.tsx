import { Referral } from '../features/cases/routes/referral';
import { IdentityForm } from '../features/summaries/components/identity-form';
import { Reports } from '../features/reports/components/reports';

/** The referral with the parts that later features add; cases knows none of them. */
export default function ReferralPage() {
  return (
    <Referral
      identity={(caseId) => <IdentityForm caseId={caseId} />}
      reports={(caseId) => <Reports caseId={caseId} mayAdd />}
    />
  );
}
