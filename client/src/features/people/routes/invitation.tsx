import '../components/entry.css';
import { Button } from '@radix-ui/themes';
import type { FieldFault } from '@weighhouse/shared/contracts/errors';
import { type SubmitEvent, useState } from 'react';
import { Link, useNavigate, useParams } from 'react-router-dom';
import { BrandMark } from '../../../components/brand-mark';
import { ErrorSummary } from '../../../components/error-summary';
import { Failure, FailureLine } from '../../../components/failure';
import { useDocumentTitle } from '../../../components/page-title';
import { SkeletonText } from '../../../components/skeleton';
import { isApiError } from '../../../lib/api';
import { useAcceptInvitation, useInvitation } from '../api/invitation';
import { useSignIn } from '../api/sign-in';
import { newPasswordFaults } from '../components/new-password';
import { NewPasswordFields } from '../components/new-password-fields';

/** The single-use link of an invitation: the invited person sets a password and is signed in. */
export default function InvitationPage() {
  const { token = '' } = useParams();
  const invitation = useInvitation(token);
  useDocumentTitle('Your invitation');
  return (
    <main className="entry">
      <p className="entry-brand">
        <BrandMark /> Weighhouse
      </p>
      {invitation.data ? (
        <>
          <h1>Welcome, {invitation.data.name}</h1>
          <p className="soft">Set a password for {invitation.data.email}. This link works once.</p>
          <SetPassword token={token} email={invitation.data.email} />
        </>
      ) : invitation.isPending ? (
        <SkeletonText lines={3} />
      ) : isApiError(invitation.error, 'offline') ? (
        <Failure error={invitation.error} retry={() => void invitation.refetch()} />
      ) : (
        <>
          <h1>This link does not work any more</h1>
          <p className="soft">
            An invitation works once and for a limited time. Ask your administrator to send it again, or sign
            in if you have set your password already.
          </p>
          <p>
            <Link to="/sign-in">Sign in</Link>
          </p>
        </>
      )}
    </main>
  );
}

function SetPassword({ token, email }: { token: string; email: string }) {
  const [typed, setTyped] = useState({ password: '', again: '' });
  const [faults, setFaults] = useState<FieldFault[]>([]);
  const accept = useAcceptInvitation(token);
  const signIn = useSignIn();
  const navigate = useNavigate();

  const submit = async (event: SubmitEvent) => {
    event.preventDefault();
    const found = newPasswordFaults('password', typed.password, typed.again);
    setFaults(found);
    if (found.length > 0) return;
    try {
      if (!accept.isSuccess) await accept.mutateAsync(typed.password);
      await signIn.mutateAsync({ email, password: typed.password });
      await navigate('/', { replace: true });
    } catch (error) {
      if (isApiError(error)) setFaults(error.fields);
    }
  };

  return (
    <form onSubmit={(event) => void submit(event)} noValidate>
      <ErrorSummary
        faults={faults}
        labels={{ password: 'New password', again: 'The same again' }}
        title="This password cannot be set"
      />
      <NewPasswordFields
        path="password"
        faults={faults}
        value={typed.password}
        again={typed.again}
        onChange={(password, again) => {
          setTyped({ password, again });
        }}
      />
      <FailureLine error={accept.error ?? signIn.error} />
      <Button size="3" type="submit" loading={accept.isPending || signIn.isPending}>
        Set password and sign in
      </Button>
    </form>
  );
}
