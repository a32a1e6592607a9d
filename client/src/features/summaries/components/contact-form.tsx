import { Button, TextArea, TextField } from '@radix-ui/themes';
import type { FieldFault } from '@weighhouse/shared/contracts/errors';
import { type SubmitEvent, useState } from 'react';
import { ErrorSummary } from '../../../components/error-summary';
import { FailureLine } from '../../../components/failure';
import { FormField } from '../../../components/form-field';
import { isApiError } from '../../../lib/api';
import { useFormat } from '../../../lib/use-format';
import { useKept } from '../../../lib/use-kept';
import { useLogContact } from '../api/log-contact';
import { checkContact, type ContactDraft, contactDraftSchema, emptyContact } from '../model/contact-draft';
import { howWords } from '../model/summary-words';
import { Choices } from './choices';

const labels = {
  at: 'When',
  how: 'How',
  reached: 'The patient was reached',
  understood: 'It was understood',
  questions: 'Questions the patient asked',
  notes: 'Notes',
};

interface Props {
  caseId: string;
  /** This contact tells the approved summary; otherwise it is an attempt or a talk about something else. */
  telling: boolean;
  onClose: () => void;
}

/** Logs a contact. What is typed stays here until the server has it. */
export function ContactForm({ caseId, telling, onClose }: Props) {
  const format = useFormat();
  const log = useLogContact(caseId, telling);
  const [now] = useState(() => format.toField(new Date().toISOString()));
  const [typed, setTyped, clear] = useKept(
    `contact.${caseId}.${telling ? 'told' : 'other'}`,
    contactDraftSchema,
    {
      ...emptyContact,
      at: now,
    },
  );
  const [faults, setFaults] = useState<FieldFault[]>([]);
  const put = (change: Partial<ContactDraft>) => {
    setTyped({ ...typed, ...change });
  };
  const reached = telling || typed.reached === 'yes';

  const send = (event: SubmitEvent) => {
    event.preventDefault();
    const checked = checkContact(typed, telling, new Date().toISOString(), format.fromField);
    setFaults(checked.faults);
    if (!checked.contact) return;
    log.mutate(checked.contact, {
      onSuccess: () => {
        clear();
        onClose();
      },
      onError: (error) => {
        if (isApiError(error)) setFaults(error.fields);
      },
    });
  };

  return (
    <form className="contact-form" onSubmit={send} noValidate>
      <ErrorSummary faults={faults} labels={labels} title="The contact was not logged" />
      <FormField label={labels.at} path="at" faults={faults}>
        {(control) => (
          <TextField.Root
            {...control}
            type="datetime-local"
            value={typed.at}
            onChange={(event) => {
              put({ at: event.target.value });
            }}
          />
        )}
      </FormField>
      <Choices
        label={labels.how}
        path="how"
        faults={faults}
        choices={howWords}
        value={typed.how}
        onChange={(how) => {
          put({ how: how as ContactDraft['how'] });
        }}
      />
      {!telling && (
        <Choices
          label={labels.reached}
          path="reached"
          faults={faults}
          choices={{ yes: 'Yes', no: 'No' }}
          value={typed.reached}
          onChange={(answer) => {
            put({ reached: answer as ContactDraft['reached'] });
          }}
        />
      )}
      {reached && (
        <>
          <Choices
            label={labels.understood}
            path="understood"
            faults={faults}
            choices={{ yes: 'Yes', partly: 'In part', no: 'No' }}
            value={typed.understood}
            onChange={(understood) => {
              put({ understood: understood as ContactDraft['understood'] });
            }}
          />
          <LongField
            name="questions"
            typed={typed}
            faults={faults}
            onChange={put}
            hint="In the patient’s own words where you can. The chair and the referrer read them."
          />
        </>
      )}
      <LongField name="notes" typed={typed} faults={faults} onChange={put} />
      {faults.length === 0 && <FailureLine error={log.error} />}
      <div className="actions">
        <Button type="submit" loading={log.isPending}>
          {telling ? 'Log that it was told' : 'Log the contact'}
        </Button>
        <Button type="button" variant="outline" onClick={onClose}>
          Not now
        </Button>
      </div>
    </form>
  );
}

interface LongProps {
  name: 'questions' | 'notes';
  typed: ContactDraft;
  faults: readonly FieldFault[];
  onChange: (change: Partial<ContactDraft>) => void;
  hint?: string;
}

function LongField({ name, typed, faults, onChange, hint }: LongProps) {
  return (
    <FormField
      label={labels[name]}
      path={name}
      faults={faults}
      optional
      {...(hint === undefined ? {} : { hint })}
    >
      {(control) => (
        <TextArea
          {...control}
          rows={3}
          maxLength={4000}
          value={typed[name]}
          onChange={(event) => {
            onChange({ [name]: event.target.value });
          }}
        />
      )}
    </FormField>
  );
}
