import { Button, TextField } from '@radix-ui/themes';
import type { FieldFault } from '@weighhouse/shared/contracts/errors';
import { type SubmitEvent, useState } from 'react';
import { ErrorSummary } from '../../../components/error-summary';
import { FailureLine } from '../../../components/failure';
import { FormField } from '../../../components/form-field';
import { isApiError } from '../../../lib/api';
import { useChangePassword } from '../api/change-password';
import { newPasswordFaults } from './new-password';
import { NewPasswordFields } from './new-password-fields';

const empty = { currentPassword: '', newPassword: '', again: '' };
const labels = { currentPassword: 'Current password', newPassword: 'New password', again: 'The same again' };

/** Changes one's own password. */
export function PasswordForm() {
  const [typed, setTyped] = useState(empty);
  const [faults, setFaults] = useState<FieldFault[]>([]);
  const change = useChangePassword();

  const submit = async (event: SubmitEvent) => {
    event.preventDefault();
    const found = newPasswordFaults('newPassword', typed.newPassword, typed.again);
    if (typed.currentPassword === '')
      found.unshift({ path: 'currentPassword', message: 'must not be empty' });
    setFaults(found);
    if (found.length > 0) return;
    try {
      await change.mutateAsync({ currentPassword: typed.currentPassword, newPassword: typed.newPassword });
      setTyped(empty);
    } catch (error) {
      if (isApiError(error, 'wrong-password'))
        setFaults([{ path: 'currentPassword', message: 'is not your password' }]);
      else if (isApiError(error)) setFaults(error.fields);
    }
  };

  return (
    <form className="account-form" onSubmit={(event) => void submit(event)} noValidate>
      <ErrorSummary faults={faults} labels={labels} title="Your password was not changed" />
      <FormField label={labels.currentPassword} path="currentPassword" faults={faults}>
        {(control) => (
          <TextField.Root
            {...control}
            size="3"
            type="password"
            autoComplete="current-password"
            value={typed.currentPassword}
            onChange={(event) => {
              setTyped({ ...typed, currentPassword: event.target.value });
            }}
          />
        )}
      </FormField>
      <NewPasswordFields
        path="newPassword"
        faults={faults}
        value={typed.newPassword}
        again={typed.again}
        onChange={(newPassword, again) => {
          setTyped({ ...typed, newPassword, again });
        }}
      />
      {change.error && faults.length === 0 && <FailureLine error={change.error} />}
      {change.isSuccess && <p role="status">Your password is changed. Every other device is signed out.</p>}
      <Button type="submit" loading={change.isPending}>
        Change password
      </Button>
    </form>
  );
}
