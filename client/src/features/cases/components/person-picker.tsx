import { Button, TextField } from '@radix-ui/themes';
import type { Person, Role } from '@weighhouse/shared/contracts/people';
import { useDeferredValue, useState } from 'react';
import { FailureLine } from '../../../components/failure';
import { usePeople } from '../../people/api/list-people';

interface Props {
  role: Role;
  label: string;
  /** People who are in already. */
  taken: ReadonlySet<string>;
  onPick: (person: Person) => void;
}

/** Finds people of one role by name, specialty or centre; picking adds one and leaves the search open. */
export function PersonPicker({ role, label, taken, onPick }: Props) {
  const [typed, setTyped] = useState('');
  const q = useDeferredValue(typed.trim());
  const found = usePeople({ role, q: q === '' ? undefined : q });
  const free = (found.data?.items ?? []).filter((person) => !taken.has(person.id) && person.active !== false);
  return (
    <div className="person-picker" role="search" aria-label={label}>
      <TextField.Root
        type="search"
        aria-label={label}
        placeholder={label}
        value={typed}
        onChange={(event) => {
          setTyped(event.target.value);
        }}
      />
      <FailureLine error={found.error} />
      <ul aria-label={`Found: ${label}`}>
        {free.map((person) => (
          <li key={person.id}>
            <span>
              {person.name}{' '}
              <span className="soft small">
                {person.specialty}, {person.centre.name}
              </span>
            </span>
            <Button
              type="button"
              size="1"
              variant="outline"
              color="gray"
              highContrast
              aria-label={`Add ${person.name}`}
              onClick={() => {
                onPick(person);
              }}
            >
              Add
            </Button>
          </li>
        ))}
      </ul>
      {found.data && free.length === 0 && <p className="soft small">Nobody else fits.</p>}
    </div>
  );
}
