import type { PanelView } from '@weighhouse/shared/contracts/differential';
import { useSignedIn } from '../../people/api/get-me';
import { useLedger } from '../ledger/ledger-context';
import { voicesOf } from '../model/people';
import { useWeights } from '../panels/use-weights';

export interface SheetPerson {
  key: string;
  name: string;
  specialty: string | null;
  weight: number;
  reason: string | null;
  contributor: PanelView['contributors'][number];
}

/** The contributors in the panel's order, with the names that this viewer may read. */
export function usePeople(panel: PanelView): SheetPerson[] {
  const { differential } = useLedger();
  const { memberOf } = useWeights();
  const me = useSignedIn();
  const voices = voicesOf(differential);
  return panel.contributors.map((contributor, index) => {
    const voice = voices.find((one) => one.key === contributor.id);
    const member = voice && memberOf(voice);
    return {
      key: contributor.id,
      name: voice?.you === true ? me.name : (voice?.name ?? `Contributor ${String(index + 1)}`),
      specialty: voice?.specialty ?? null,
      weight: contributor.weight,
      reason: member?.reason ?? null,
      contributor,
    };
  });
}

export function SheetPeople({ people }: { people: readonly SheetPerson[] }) {
  return (
    <table>
      <thead>
        <tr>
          <th scope="col">No.</th>
          <th scope="col">Whose numbers</th>
          <th scope="col">Weight</th>
        </tr>
      </thead>
      <tbody>
        {people.map(({ key, name, specialty, weight, reason }, index) => (
          <tr key={key}>
            <td className="figures">{index + 1}</td>
            <th scope="row">
              {name}
              {specialty !== null && specialty !== '' && `, ${specialty}`}
              {reason !== null && reason !== '' && ` (${reason})`}
            </th>
            <td className="figures">{weight}</td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}

/** The groups that are in use: letter, name, overlap, reason. */
export function SheetGroups({ panel }: { panel: PanelView }) {
  const { settings } = useLedger().differential;
  const used = groupLetters(panel);
  if (used.size === 0) return <p>No groups of findings that overlap.</p>;
  return (
    <>
      {[...used].map(([id, letter]) => {
        const group = settings.groups.find((one) => one.id === id);
        if (!group) return null;
        return (
          <p key={id}>
            <b>{letter}</b> {group.label}: overlap {Math.round(group.overlap * 100)} of 100
            {group.reason !== null && group.reason !== '' && ` (${group.reason})`}.
          </p>
        );
      })}
    </>
  );
}

/** The groups that some finding is in, each with a letter of its own, in the order of the findings. */
export function groupLetters(panel: PanelView): Map<string, string> {
  const ids = new Set(panel.findings.flatMap(({ group }) => (group === undefined ? [] : [group])));
  return new Map([...ids].map((id, index) => [id, `G${String(index + 1)}`]));
}
