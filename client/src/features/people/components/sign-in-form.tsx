import { Button, TextField } from '@radix-ui/themes';
import { type SubmitEvent, useState } from 'react';
import { FailureLine } from '../../../components/failure';
import { FormField } from '../../../components/form-field';
import { isApiError } from '../../../lib/api';
import { waitWords } from '../../../lib/words';
import { useSignIn } from '../api/sign-in';
import { useCountdown } from './use-countdown';

/** E-mail and password. The answer is the same for an unknown address and a wrong password. */
export function SignInForm({ email: known = '' }: { email?: string }) {
  const [email, setEmail] = useState(known);
  const [password, setPassword] = useState('');
  const signIn = useSignIn();
  // The wait is for the address that was tried; a mended one need not wait with it.
  const sameAddress = signIn.variables?.email === email;
  const throttled = isApiError(signIn.error, 'too-many') && sameAddress ? signIn.error : null;
  const wait = useCountdown(throttled ? (throttled.retryAfterSeconds ?? 60) : 0, signIn.submittedAt);

  const submit = (event: SubmitEvent) => {
    event.preventDefault();
    signIn.mutate({ email, password });
  };

  return (
    <form onSubmit={submit}>
      <FormField label="E-mail" path="email">
        {(control) => (
          <TextField.Root
            {...control}
            size="3"
            type="email"
            autoComplete="username"
            required
            value={email}
            onChange={(event) => {
              setEmail(event.target.value);
            }}
          />
        )}
      </FormField>
      <FormField label="Password" path="password">
        {(control) => (
          <TextField.Root
            {...control}
            size="3"
            type="password"
            autoComplete="current-password"
            required
            value={password}
            onChange={(event) => {
              setPassword(event.target.value);
            }}
          />
        )}
      </FormField>
      {isApiError(signIn.error, 'wrong-credentials') && (
        <p className="failure-line" role="alert">
          This e-mail and password do not belong together. Check both and try again.
        </p>
      )}
      {throttled && wait > 0 && (
        <p className="failure-line" role="alert">
          Too many tries. You can try again in {waitWords(wait)}.
        </p>
      )}
      {signIn.error &&
        !isApiError(signIn.error, 'too-many') &&
        !isApiError(signIn.error, 'wrong-credentials') && <FailureLine error={signIn.error} />}
      <Button size="3" type="submit" loading={signIn.isPending} disabled={wait > 0}>
        Sign in
      </Button>
    </form>
  );
}
