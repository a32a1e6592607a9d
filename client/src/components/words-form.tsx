import { Button, TextArea } from '@radix-ui/themes';
import type { FieldFault } from '@weighhouse/shared/contracts/errors';
import { type SubmitEvent, useState } from 'react';
import { z } from 'zod';
import { isApiError } from '../lib/api-error';
import { useKept } from '../lib/use-kept';
import { FailureLine } from './failure';
import { FormField } from './form-field';

interface Props {
  /** Where the words are kept in this browser until they are sent. */
  keptKey: string;
  label: string;
  hint?: string;
  /** What is there before anything is typed. */
  before?: string;
  /** What the button does. */
  verb: string;
  /** Resolves when the server has the words; rejects with the error to show. */
  onSend: (words: string) => Promise<unknown>;
  /** After sending, or when the person does not want to now. */
  onClose: () => void;
}

/** One field of words that must be given, in place. What is typed survives a refusal and a closed tab. */
export function WordsForm({ keptKey, label, hint, before = '', verb, onSend, onClose }: Props) {
  const [words, setWords, clear] = useKept(keptKey, z.string(), before);
  const [faults, setFaults] = useState<FieldFault[]>([]);
  const [error, setError] = useState<unknown>(null);
  const [busy, setBusy] = useState(false);
  const path = `words-${keptKey}`;

  const send = async (event: SubmitEvent) => {
    event.preventDefault();
    const empty = words.trim() === '';
    setFaults(empty ? [{ path, message: 'must not be empty' }] : []);
    setError(null);
    if (empty) return;
    setBusy(true);
    try {
      await onSend(words.trim());
      clear();
      onClose();
    } catch (refused) {
      const found = isApiError(refused) ? refused.fields : [];
      setFaults(found.map(({ message }) => ({ path, message })));
      if (found.length === 0) setError(refused);
    } finally {
      setBusy(false);
    }
  };

  return (
    <form onSubmit={(event) => void send(event)} noValidate>
      <FormField label={label} path={path} faults={faults} {...(hint === undefined ? {} : { hint })}>
        {(control) => (
          <TextArea
            {...control}
            autoFocus
            rows={4}
            maxLength={4000}
            value={words}
            onChange={(event) => {
              setWords(event.target.value);
            }}
          />
        )}
      </FormField>
      <FailureLine error={error} />
      <div className="actions">
        <Button type="submit" loading={busy}>
          {verb}
        </Button>
        <Button type="button" variant="outline" onClick={onClose}>
          Not now
        </Button>
      </div>
    </form>
  );
}
