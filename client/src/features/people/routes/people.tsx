import '../components/people.css';
import { Button, Dialog, TextField } from '@radix-ui/themes';
import { type Person, type Role, roles } from '@weighhouse/shared/contracts/people';
import { useDeferredValue, useState } from 'react';
import { EmptyState } from '../../../components/empty-state';
import { Failure } from '../../../components/failure';
import { PageTitle } from '../../../components/page-title';
import { SelectBox } from '../../../components/select-box';
import { SkeletonRows } from '../../../components/skeleton';
import { capital, counted } from '../../../lib/words';
import { usePeople } from '../api/list-people';
import { CentreList } from '../components/centre-list';
import { PeopleRows } from '../components/people-rows';
import { PersonForm } from '../components/person-form';

/** For administrators: who takes part in the network, in which roles. No clinical word. */
export default function PeoplePage() {
  const [role, setRole] = useState<Role | ''>('');
  const [q, setQ] = useState('');
  const [editing, setEditing] = useState<Person | 'new' | null>(null);
  const [said, setSaid] = useState('');
  const found = usePeople({
    role: role === '' ? undefined : role,
    q: useDeferredValue(q.trim()) || undefined,
  });
  const invite = () => {
    setEditing('new');
  };
  const narrowed = role !== '' || q.trim() !== '';
  const count = found.data?.items.length;
  return (
    <div className="page">
      <PageTitle actions={<Button onClick={invite}>Invite somebody</Button>}>
        {count === undefined || narrowed ? 'People' : `${counted(count, 'person', 'people')} in the network`}
      </PageTitle>
      <div className="people-tools" role="search">
        <TextField.Root
          aria-label="Search by name, specialty or centre"
          placeholder="Name, specialty or centre"
          type="search"
          value={q}
          onChange={(event) => {
            setQ(event.target.value);
          }}
        />
        <SelectBox
          aria-label="Role"
          value={role}
          onChange={(event) => {
            setRole(event.target.value as Role | '');
          }}
        >
          <option value="">Every role</option>
          {roles.map((one) => (
            <option key={one} value={one}>
              {capital(one)}
            </option>
          ))}
        </SelectBox>
      </div>
      <p role="status">{said}</p>
      {found.data ? (
        found.data.items.length > 0 ? (
          <PeopleRows people={found.data.items} onChange={setEditing} onSaid={setSaid} />
        ) : (
          <EmptyState title={narrowed ? 'Nobody fits the search and the role.' : 'Nobody is here yet.'}>
            Invite people by e-mail; they set their own password.
          </EmptyState>
        )
      ) : found.isPending ? (
        <SkeletonRows rows={8} />
      ) : (
        <Failure
          error={found.error}
          what="The people could not be loaded."
          retry={() => void found.refetch()}
        />
      )}
      <CentreList />
      <Dialog.Root
        open={editing !== null}
        onOpenChange={(open) => {
          if (!open) setEditing(null);
        }}
      >
        <Dialog.Content className="form-dialog" aria-describedby={undefined}>
          <Dialog.Title size="4">
            {editing === 'new' ? 'Invite somebody' : `Change ${editing?.name ?? ''}`}
          </Dialog.Title>
          {editing !== null && (
            <PersonForm
              person={editing === 'new' ? null : editing}
              onDone={(words) => {
                setSaid(words);
                setEditing(null);
              }}
            />
          )}
        </Dialog.Content>
      </Dialog.Root>
    </div>
  );
}
