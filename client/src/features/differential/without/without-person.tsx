import { useSignedIn } from '../../people/api/get-me';
import { useLedger } from '../ledger/ledger-context';
import { WithoutButton } from './without-button';

/** The standing without one person of the team, for whom the names are told. */
export function WithoutPerson({ personId, name }: { personId: string; name: string }) {
  const { differential } = useLedger();
  const me = useSignedIn();
  const key =
    personId === me.id
      ? differential.mine?.key
      : differential.others?.find((other) => other.personId === personId)?.key;
  if (key === undefined) return null;
  return <WithoutButton left={{ kind: 'contributor', id: key }} name={name} />;
}
