import '../components/people.css';
import { Button } from '@radix-ui/themes';
import { useState } from 'react';
import { ConfirmDialog } from '../../../components/confirm-dialog';
import { PageTitle } from '../../../components/page-title';
import { useSignedIn } from '../api/get-me';
import { useSignOut } from '../api/sign-out';
import { PasswordForm } from '../components/password-form';
import { rolesLine } from '../components/role-words';

/** One's own account: who one is here, the password, and the devices that are signed in. */
export default function AccountPage() {
  const me = useSignedIn();
  const signOut = useSignOut();
  const [asking, setAsking] = useState(false);
  return (
    <div className="page">
      <PageTitle note={`${me.email}. ${me.specialty}, ${me.centre}. ${rolesLine(me.roles)}.`}>
        {me.name}
      </PageTitle>
      <section aria-labelledby="password">
        <div className="section-head">
          <h2 id="password">Password</h2>
        </div>
        <PasswordForm />
      </section>
      <section aria-labelledby="devices">
        <div className="section-head">
          <h2 id="devices">Devices</h2>
        </div>
        <p className="prose account-form">
          If you left a device signed in somewhere, sign out everywhere. Drafts that the server has stay.
        </p>
        <Button
          variant="outline"
          color="gray"
          highContrast
          onClick={() => {
            setAsking(true);
          }}
        >
          Sign out everywhere
        </Button>
        <ConfirmDialog
          open={asking}
          onOpenChange={setAsking}
          title="Sign out everywhere?"
          verb="Sign out everywhere"
          onConfirm={() => signOut.mutateAsync({ everywhere: true })}
        >
          You are signed out on this and every other device. What a device has typed and not sent yet is
          removed here.
        </ConfirmDialog>
      </section>
    </div>
  );
}
