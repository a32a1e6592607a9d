import '../components/referral.css';
import type { Case } from '@weighhouse/shared/contracts/cases';
import type { ReactNode } from 'react';
import { Link, useNavigate } from 'react-router-dom';
import { EmergencyCaution } from '../../../components/caution';
import { EmptyState } from '../../../components/empty-state';
import { Failure } from '../../../components/failure';
import { PageTitle } from '../../../components/page-title';
import { SkeletonPage } from '../../../components/skeleton';
import { useCase, useCaseId } from '../api/get-case';
import { CaseBanner } from '../components/case-banner';
import { DraftConflict } from '../components/draft-conflict';
import {
  ConsentFields,
  HistoryField,
  PatientFields,
  QuestionField,
  UrgencyFields,
} from '../components/referral-fields';
import { ReferralSide } from '../components/referral-side';
import { useDraft } from '../components/use-draft';

/** What later parts of the product put into the form: the identity card and the reports. */
export interface ReferralSlots {
  identity: (caseId: string) => ReactNode;
  reports: (caseId: string) => ReactNode;
}

/** The referral while it is written: a draft, or one that came back with a question. */
export function Referral(slots: ReferralSlots) {
  const caseId = useCaseId();
  const found = useCase(caseId);
  if (found.isPending) return <SkeletonPage />;
  if (!found.data)
    return (
      <div className="page">
        <Failure
          error={found.error}
          what="This referral could not be opened."
          retry={() => void found.refetch()}
        />
      </div>
    );
  if (!found.data.abilities.includes('case.edit'))
    return (
      <div className="page">
        <PageTitle>This referral cannot be changed now</PageTitle>
        <EmptyState
          title="It has been handed over."
          action={<Link to={`/cases/${caseId}`}>Open the case</Link>}
        >
          A chair can return it with a question; then it is open for writing again.
        </EmptyState>
      </div>
    );
  return <Form key={caseId} of={found.data} {...slots} />;
}

function Form({ of, identity, reports }: { of: Case } & ReferralSlots) {
  const draft = useDraft(of);
  const navigate = useNavigate();
  const fields = { form: draft.form, faults: draft.faults, onChange: draft.change };
  const part = (title: string, children: ReactNode) => (
    <section className="referral-part" aria-label={title}>
      <h2>{title}</h2>
      {children}
    </section>
  );
  return (
    <div className="page referral">
      <div>
        <PageTitle note="Saved as you type. Nobody else sees it before you submit it.">
          {of.state === 'returned' ? 'A chair asks for more' : 'Your referral is a draft'}
        </PageTitle>
        {of.state === 'returned' && <CaseBanner of={of} quiet />}
        <EmergencyCaution />
        <DraftConflict draft={draft} />
        {part('What you want to know', <QuestionField {...fields} />)}
        {part('The patient', <PatientFields {...fields} />)}
        {part('Who the patient is', identity(of.id))}
        {part('Urgency', <UrgencyFields {...fields} />)}
        {part('Consent', <ConsentFields {...fields} />)}
        {part('What is known', <HistoryField {...fields} fills={draft.fills} />)}
        {part('Reports', reports(of.id))}
      </div>
      <ReferralSide
        of={of}
        saving={draft.saving}
        flush={draft.flush}
        onSubmitted={() => void navigate(`/cases/${of.id}`)}
        onWithdrawn={() => void navigate('/cases')}
      />
    </div>
  );
}
