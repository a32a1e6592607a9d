import { AlertDialog, Button, TextArea, TextField } from '@radix-ui/themes';
import { type SubmitEvent, type ReactNode, useState } from 'react';
import { isApiError } from '../lib/api-error';
import { FailureLine } from './failure';
import { FormField } from './form-field';

export interface ConfirmInput {
  words: string;
  password: string;
}

interface Props {
  open: boolean;
  onOpenChange: (open: boolean) => void;
  title: string;
  children?: ReactNode;
  /** What the button does, as a verb: "Close with this plan". */
  verb: string;
  /** Cannot be undone or frightens: the button is red. */
  danger?: boolean;
  /** Asks for words under this label. */
  wordsLabel?: string;
  /** The words may be left out. */
  wordsOptional?: boolean;
  /** Asks for the person's own password. */
  password?: boolean;
  /** Rejects with the error to show; resolves to close. */
  onConfirm: (input: ConfirmInput) => Promise<unknown>;
}

/** A question before what cannot be undone. */
export function ConfirmDialog({ open, onOpenChange, ...form }: Props) {
  return (
    <AlertDialog.Root open={open} onOpenChange={onOpenChange}>
      <AlertDialog.Content className="confirm-dialog">
        <ConfirmForm
          {...form}
          onDone={() => {
            onOpenChange(false);
          }}
        />
      </AlertDialog.Content>
    </AlertDialog.Root>
  );
}

/** Apart from the dialog, so that its state lives exactly as long as it is open. */
function ConfirmForm(props: Omit<Props, 'open' | 'onOpenChange'> & { onDone: () => void }) {
  const { title, children, verb, danger, wordsLabel, wordsOptional, password, onConfirm, onDone } = props;
  const [input, setInput] = useState<ConfirmInput>({ words: '', password: '' });
  const [error, setError] = useState<unknown>(null);
  const [busy, setBusy] = useState(false);
  const missing =
    (wordsLabel !== undefined && wordsOptional !== true && input.words.trim() === '') ||
    (password === true && input.password === '');

  const confirm = async (event: SubmitEvent) => {
    event.preventDefault();
    setBusy(true);
    setError(null);
    try {
      await onConfirm(input);
      onDone();
    } catch (failed) {
      setError(failed);
    } finally {
      setBusy(false);
    }
  };

  const faults = isApiError(error) ? error.fields : [];
  return (
    <form onSubmit={(event) => void confirm(event)}>
      <AlertDialog.Title size="4">{title}</AlertDialog.Title>
      <AlertDialog.Description size="2">{children ?? ''}</AlertDialog.Description>
      {wordsLabel !== undefined && (
        <FormField label={wordsLabel} path="words" faults={faults} optional={wordsOptional === true}>
          {(control) => (
            <TextArea
              {...control}
              rows={4}
              value={input.words}
              onChange={(event) => {
                setInput({ ...input, words: event.target.value });
              }}
            />
          )}
        </FormField>
      )}
      {password === true && (
        <FormField label="Your password" path="password" faults={faults}>
          {(control) => (
            <TextField.Root
              {...control}
              type="password"
              autoComplete="current-password"
              value={input.password}
              onChange={(event) => {
                setInput({ ...input, password: event.target.value });
              }}
            />
          )}
        </FormField>
      )}
      <FailureLine error={error} />
      {faults.length > 0 && (
        <ul className="plain-list">
          {faults.map((fault) => (
            <li key={fault.path + fault.message}>{fault.message}</li>
          ))}
        </ul>
      )}
      <div className="actions dialog-actions">
        <Button type="submit" disabled={missing} loading={busy} color={danger === true ? 'red' : undefined}>
          {verb}
        </Button>
        <AlertDialog.Cancel>
          <Button variant="outline" color="gray" highContrast type="button">
            Cancel
          </Button>
        </AlertDialog.Cancel>
      </div>
    </form>
  );
}
