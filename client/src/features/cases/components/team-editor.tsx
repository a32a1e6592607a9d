import type { Part } from '@weighhouse/shared/contracts/cases';
import type { FieldFault } from '@weighhouse/shared/contracts/errors';
import type { Person, Role } from '@weighhouse/shared/contracts/people';
import { faultOf, fieldId } from '../../../components/faults';
import { PersonPicker } from './person-picker';
import { SeatRows } from './seat-rows';
import type { Seat } from './team-form';

interface Props {
  seats: Seat[];
  faults: readonly FieldFault[];
  weightsFrozen: boolean;
  onSeats: (seats: Seat[]) => void;
}

const groups: { part: Part; role: Role; path: string; title: string; note: string; find: string }[] = [
  {
    part: 'contributor',
    role: 'specialist',
    path: 'contributors',
    title: 'Contributors',
    note: 'At least two. A weight says how much somebody counts on this case, 0 to 3; anything but 1 needs a reason.',
    find: 'Find specialists',
  },
  {
    part: 'liaison',
    role: 'liaison',
    path: 'liaisons',
    title: 'Liaison',
    note: 'Tells the patient; sees no judgement and no report.',
    find: 'Find a liaison',
  },
];

const seatOf = (person: Person, part: Part): Seat => ({
  personId: person.id,
  name: person.name,
  from: `${person.specialty}, ${person.centre.name}`,
  part,
  weight: '1',
  reason: '',
});

const same = (one: Seat, other: Seat) => one.personId === other.personId && one.part === other.part;

/** Who sits on the case, in which part, and how much each contributor counts. */
export function TeamEditor({ seats, faults, weightsFrozen, onSeats }: Props) {
  return groups.map(({ part, role, path, title, note, find }) => {
    const members = seats.filter((seat) => seat.part === part);
    const fault = faultOf(faults, path);
    return (
      <section key={part} aria-labelledby={`team-${part}`} id={fieldId(path)} tabIndex={-1}>
        <div className="section-head">
          <h3 id={`team-${part}`}>{title}</h3>
        </div>
        <p className="soft small">{note}</p>
        {fault !== null && <p className="field-fault">{fault}</p>}
        <SeatRows
          seats={members}
          faults={faults}
          weightsFrozen={weightsFrozen}
          onChange={(changed, change) => {
            onSeats(seats.map((seat) => (same(seat, changed) ? { ...seat, ...change } : seat)));
          }}
          onRemove={(gone) => {
            onSeats(seats.filter((seat) => !same(seat, gone)));
          }}
        />
        <PersonPicker
          role={role}
          label={find}
          taken={new Set(members.map((seat) => seat.personId))}
          onPick={(person) => {
            onSeats([...seats, seatOf(person, part)]);
          }}
        />
      </section>
    );
  });
}
