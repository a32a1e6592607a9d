import { Button, TextArea, TextField } from '@radix-ui/themes';
import type { FieldFault } from '@weighhouse/shared/contracts/errors';
import { type Identity, identityInputSchema, identitySchema } from '@weighhouse/shared/contracts/summaries';
import { type SyntheticEvent, useState } from 'react';
import { BothTexts } from '../../../components/both-texts';
import { ErrorSummary } from '../../../components/error-summary';
import { FailureLine } from '../../../components/failure';
import { faultsIn } from '../../../components/faults';
import { type ControlProps, FormField } from '../../../components/form-field';
import { type ApiError, isApiError } from '../../../lib/api';
import { useFormat } from '../../../lib/use-format';
import { useSaveIdentity } from '../api/save-identity';
import { IdentityCard } from './identity-card';
import { useLeaveWarning } from './use-leave-warning';

type Card = NonNullable<Identity['card']>;
const empty: Card = { name: '', birthDate: '', telephone: '', language: '', howToReach: '' };
const labels: Record<keyof Card, string> = {
  name: 'Name',
  birthDate: 'Birth date',
  telephone: 'Telephone',
  language: 'Language',
  howToReach: 'How to be reached',
};
const lengths = { name: 200, telephone: 40, language: 120, howToReach: 1000 } as const;

interface Props {
  caseId: string;
  identity: Identity;
  onSaved: (identity: Identity) => void;
  onClose: () => void;
}

/**
 * The card to write. It is no form element of its own, so that it can stand inside another one. Unlike clinical text
 * it is not kept in the browser: a name does not belong on a shared computer. Leaving it unsaved asks first.
 */
export function IdentityFields({ caseId, identity, onSaved, onClose }: Props) {
  const format = useFormat();
  const save = useSaveIdentity(caseId);
  const [typed, setTyped] = useState(identity.card ?? empty);
  const [faults, setFaults] = useState<FieldFault[]>([]);
  const [theirs, setTheirs] = useState<Identity | null>(null);
  useLeaveWarning(JSON.stringify(typed) !== JSON.stringify(identity.card ?? empty));

  const send = (version: number) => {
    const input = { version, ...typed };
    const found = faultsIn(identityInputSchema, input);
    if (typed.birthDate > format.today())
      found.push({ path: 'birthDate', message: 'must not be in the future' });
    setFaults(found);
    if (found.length > 0) return;
    save.mutate(input, {
      onSuccess: onSaved,
      onError: (error) => {
        setTheirs(theirCard(error, identity));
        if (isApiError(error)) setFaults(error.fields);
      },
    });
  };
  const field = (name: keyof Card, control: ControlProps) => ({
    ...control,
    value: typed[name],
    onChange: (event: { target: { value: string } }) => {
      setTyped({ ...typed, [name]: event.target.value });
    },
    // Enter must not send the form around it.
    onKeyDown: (event: SyntheticEvent & { key: string }) => {
      if (event.key !== 'Enter' || name === 'howToReach') return;
      event.preventDefault();
      send(identity.version);
    },
  });

  return (
    <div className="identity" role="group" aria-label="Identity card">
      {theirs?.card && (
        <BothTexts
          what="the card"
          mine={<IdentityCard card={typed} />}
          theirs={<IdentityCard card={theirs.card} />}
          onKeepMine={() => {
            setTheirs(null);
            send(theirs.version);
          }}
          onTakeTheirs={() => {
            onSaved(theirs);
          }}
        />
      )}
      <ErrorSummary faults={faults} labels={labels} title="The card was not saved" />
      <div className="identity-fields">
        <FormField label={labels.name} path="name" faults={faults}>
          {(control) => (
            <TextField.Root {...field('name', control)} maxLength={lengths.name} autoComplete="off" />
          )}
        </FormField>
        <FormField label={labels.birthDate} path="birthDate" faults={faults}>
          {(control) => (
            <TextField.Root
              {...field('birthDate', control)}
              type="date"
              max={format.today()}
              autoComplete="off"
            />
          )}
        </FormField>
        <FormField label={labels.telephone} path="telephone" faults={faults} optional>
          {(control) => (
            <TextField.Root
              {...field('telephone', control)}
              type="tel"
              maxLength={lengths.telephone}
              autoComplete="off"
            />
          )}
        </FormField>
        <FormField
          label={labels.language}
          path="language"
          faults={faults}
          optional
          hint="And whether an interpreter is needed."
        >
          {(control) => (
            <TextField.Root {...field('language', control)} maxLength={lengths.language} autoComplete="off" />
          )}
        </FormField>
      </div>
      <FormField
        label={labels.howToReach}
        path="howToReach"
        faults={faults}
        optional
        hint="Which times, through whom, in which form."
      >
        {(control) => <TextArea {...field('howToReach', control)} rows={2} maxLength={lengths.howToReach} />}
      </FormField>
      {faults.length === 0 && theirs === null && <FailureLine error={save.error} />}
      <div className="actions">
        <Button
          type="button"
          loading={save.isPending}
          onClick={() => {
            send(identity.version);
          }}
        >
          Save the card
        </Button>
        <Button type="button" variant="outline" onClick={onClose}>
          Not now
        </Button>
      </div>
    </div>
  );
}

/** The card in a `stale` refusal. */
function theirCard(error: Error, mine: Identity): Identity | null {
  if (!isApiError(error, 'stale')) return null;
  return identitySchema.safeParse(withAbilities(error, mine)).data ?? null;
}

function withAbilities(error: ApiError, { abilities }: Identity): unknown {
  return typeof error.current === 'object' ? { abilities, ...error.current } : null;
}
