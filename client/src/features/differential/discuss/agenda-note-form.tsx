import { Button, TextArea } from '@radix-ui/themes';
import type { AgendaItem } from '@weighhouse/shared/contracts/differential';
import type { Finding } from '@weighhouse/shared/contracts/findings';
import { type SubmitEvent, useState } from 'react';
import { z } from 'zod';
import { BothTexts } from '../../../components/both-texts';
import { FailureLine } from '../../../components/failure';
import { FormField } from '../../../components/form-field';
import { isApiError } from '../../../lib/api-error';
import { useKept } from '../../../lib/use-kept';
import { usePutOnAgenda } from '../api/change-agenda';
import { useLedger } from '../ledger/ledger-context';

interface Props {
  finding: Finding;
  /** As it stands on the agenda now; null where the row is not on it. */
  item: AgendaItem | null;
  onClose: () => void;
}

/** The chair's note on a row of the agenda. What is typed survives a refusal and a closed tab. */
export function AgendaNoteForm({ finding, item, onClose }: Props) {
  const { differential } = useLedger();
  const keptKey = `agenda.${differential.caseId}.${finding.id}`;
  const [note, setNote, clear] = useKept(keptKey, z.string(), item?.note ?? '');
  // What the typing began from: a later note of somebody else is shown beside it, never overwritten silently.
  const [base, setBase] = useState(item?.version ?? 0);
  const [empty, setEmpty] = useState(false);
  const put = usePutOnAgenda(differential.caseId, finding.id);
  const stale = isApiError(put.error, 'stale');
  const path = `agenda-${finding.id}`;
  const faults = empty
    ? [{ path, message: 'must say in words what to discuss' }]
    : isApiError(put.error)
      ? put.error.fields.map(({ message }) => ({ path, message }))
      : [];

  const close = () => {
    clear();
    onClose();
  };
  const send = async (version: number) => {
    setEmpty(note.trim() === '');
    if (note.trim() === '') return;
    try {
      await put.mutateAsync({ note: note.trim(), version });
      close();
    } catch {
      // The mutation holds the error for the screen; the words stay.
    }
  };

  return (
    <form
      noValidate
      onSubmit={(event: SubmitEvent) => {
        event.preventDefault();
        void send(base);
      }}
    >
      <FormField label="What to discuss" path={path} faults={faults}>
        {(control) => (
          <TextArea
            {...control}
            autoFocus
            rows={3}
            maxLength={1000}
            value={note}
            onChange={(event) => {
              setNote(event.target.value);
            }}
          />
        )}
      </FormField>
      {stale && (
        <BothTexts
          what="this note"
          mine={<p>{note}</p>}
          theirs={<p>{item?.note ?? 'It was taken off the agenda.'}</p>}
          onKeepMine={() => {
            setBase(item?.version ?? 0);
            void send(item?.version ?? 0);
          }}
          onTakeTheirs={close}
        />
      )}
      {!stale && faults.length === 0 && <FailureLine error={put.error} />}
      <div className="actions">
        <Button type="submit" loading={put.isPending}>
          {item ? 'Save the note' : 'Put on the agenda'}
        </Button>
        <Button type="button" variant="outline" onClick={close}>
          Not now
        </Button>
      </div>
    </form>
  );
}
