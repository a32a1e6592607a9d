import type { TeamMember } from '@weighhouse/shared/contracts/cases';
import { useSignedIn } from '../../people/api/get-me';
import { useCase } from '../../cases/api/get-case';
import { useLedger } from '../ledger/ledger-context';
import type { Voice } from '../model/people';

/** The weights that the chair gave, from the case's team, with the reasons where one may read them. */
export function useWeights() {
  const { differential } = useLedger();
  const me = useSignedIn();
  const team = useCase(differential.caseId).data?.team ?? [];
  const contributors = team.filter((member) => member.part === 'contributor');
  const memberOf = (voice: Voice): TeamMember | undefined => {
    const id = voice.you ? me.id : differential.others?.find((other) => other.key === voice.key)?.personId;
    return id == null ? undefined : contributors.find((member) => member.person.id === id);
  };
  return {
    memberOf,
    weightOf: (voice: Voice) => memberOf(voice)?.weight ?? voice.weight,
  };
}
