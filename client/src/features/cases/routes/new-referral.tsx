import '../components/referral.css';
import { Button } from '@radix-ui/themes';
import { type SubmitEvent, useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { EmergencyCaution } from '../../../components/caution';
import { FailureLine } from '../../../components/failure';
import { PageTitle } from '../../../components/page-title';
import { isApiError } from '../../../lib/api';
import { forget, keep, kept } from '../../../lib/kept';
import { useNewCase } from '../api/draft';
import type { DraftForm } from '../components/draft-form';
import { QuestionField } from '../components/referral-fields';

const key = 'new-referral';

/** A case begins with its question; with that the draft exists on the server and everything else is saved there. */
export default function NewReferralPage() {
  const [question, setQuestion] = useState(() => {
    const before = kept(key);
    return typeof before === 'string' ? before : '';
  });
  const open = useNewCase();
  const navigate = useNavigate();

  const submit = async (event: SubmitEvent) => {
    event.preventDefault();
    const made = await open.mutateAsync({ question });
    forget(key);
    await navigate(`/cases/${made.id}/edit`, { replace: true });
  };

  return (
    <div className="page new-referral">
      <PageTitle note="Begin with the question. Patient, consent, history and reports follow, saved as you write.">
        A new referral
      </PageTitle>
      <EmergencyCaution />
      <form className="referral-part" onSubmit={(event) => void submit(event).catch(() => undefined)}>
        <div className="prose">
          <QuestionField
            form={{ question } as DraftForm}
            faults={isApiError(open.error) ? open.error.fields : []}
            onChange={(part) => {
              setQuestion(part.question ?? '');
              keep(key, part.question ?? '');
            }}
          />
        </div>
        <FailureLine error={open.error} />
        <Button type="submit" disabled={question.trim() === ''} loading={open.isPending}>
          Begin the referral
        </Button>
      </form>
    </div>
  );
}
