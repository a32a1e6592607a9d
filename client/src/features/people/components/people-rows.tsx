import { Button } from '@radix-ui/themes';
import type { Person } from '@weighhouse/shared/contracts/people';
import { useState } from 'react';
import { ConfirmDialog } from '../../../components/confirm-dialog';
import { useFormat } from '../../../lib/use-format';
import { useChangePeople } from '../api/change-people';
import { useSignedIn } from '../api/get-me';
import { personState, rolesLine } from './role-words';

interface Props {
  people: Person[];
  onChange: (person: Person) => void;
  onSaid: (said: string) => void;
}

/** The people, with what an administrator may do with each. */
export function PeopleRows({ people, onChange, onSaid }: Props) {
  const [leavingId, setLeavingId] = useState<string | null>(null);
  const leaving = people.find((person) => person.id === leavingId);
  const { setActive } = useChangePeople();
  return (
    <>
      <ul className="people-list">
        {people.map((person) => (
          <Row
            key={person.id}
            person={person}
            onChange={() => {
              onChange(person);
            }}
            onDeactivate={() => {
              setLeavingId(person.id);
            }}
            onSaid={onSaid}
          />
        ))}
      </ul>
      <ConfirmDialog
        open={leaving !== undefined}
        onOpenChange={(open) => {
          if (!open) setLeavingId(null);
        }}
        title={`Deactivate ${leaving?.name ?? ''}?`}
        verb="Deactivate"
        danger
        onConfirm={async () => {
          if (!leaving) return;
          await setActive.mutateAsync({ person: leaving, active: false });
          onSaid(`${leaving.name} is deactivated and signed out.`);
        }}
      >
        They are signed out at once and cannot sign in again. What they wrote and judged stays in its cases.
        You can activate them again later.
      </ConfirmDialog>
    </>
  );
}

function Row({
  person,
  onChange,
  onDeactivate,
  onSaid,
}: {
  person: Person;
  onChange: () => void;
  onDeactivate: () => void;
  onSaid: (said: string) => void;
}) {
  const format = useFormat();
  const me = useSignedIn();
  const { setActive, inviteAgain } = useChangePeople();
  const active = person.active !== false;
  const button = (label: string, onClick: () => void, busy = false) => (
    <Button
      variant="outline"
      color="gray"
      highContrast
      size="1"
      loading={busy}
      onClick={onClick}
      aria-label={`${label}: ${person.name}`}
    >
      {label}
    </Button>
  );
  return (
    <li className={active ? '' : 'gone'}>
      <div>
        <span className="row-title">{person.name}</span>
        <br />
        <span className="soft">{person.email}</span>
      </div>
      <div>
        {person.specialty}, {person.centre.name}
        <br />
        <span className="soft">{rolesLine(person.roles)}</span>
      </div>
      <div>
        {personState(person)}
        {person.lastSeenAt != null && (
          <>
            <br />
            <span className="soft">last here {format.day(person.lastSeenAt)}</span>
          </>
        )}
      </div>
      <div className="actions">
        {person.invited === true &&
          active &&
          button(
            'Send again',
            () => {
              inviteAgain.mutate(person.id, {
                onSuccess: () => {
                  onSaid(`A new invitation to ${person.email ?? person.name} is on its way.`);
                },
                onError: (error) => {
                  onSaid(error.message);
                },
              });
            },
            inviteAgain.isPending,
          )}
        {button('Change', onChange)}
        {active
          ? person.id !== me.id && button('Deactivate', onDeactivate)
          : button('Activate', () => {
              setActive.mutate(
                { person, active: true },
                {
                  onSuccess: () => {
                    onSaid(`${person.name} can sign in again.`);
                  },
                  onError: (error) => {
                    onSaid(error.message);
                  },
                },
              );
            })}
      </div>
    </li>
  );
}
