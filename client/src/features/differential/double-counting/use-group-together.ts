import { useMutation } from '@tanstack/react-query';
import type { Settings } from '@weighhouse/shared/contracts/cases';
import { useChangeFinding } from '../../findings/api/change-finding';
import { useChangeSettings } from '../api/change-settings';
import { groupFor, type Warning } from './warnings';

/** What a new group starts from: half, which the chair changes where the groups are. */
export const startingOverlap = 0.5;

/** Puts the findings of a warning into one group: the one that some are in, else a new one. */
export function useGroupTogether(caseId: string, groups: Settings['groups']) {
  const settings = useChangeSettings(caseId);
  const finding = useChangeFinding(caseId);
  return useMutation({
    mutationFn: async (warning: Warning) => {
      const groupId = warning.groupId ?? (await newGroup(warning));
      for (const { id, version, groupId: known } of warning.findings)
        if (known === null) await finding.mutateAsync({ findingId: id, version, groupId });
    },
  });

  async function newGroup(warning: Warning): Promise<string> {
    const { label, reason } = groupFor(warning);
    const kept = groups.map(({ reason: why, ...group }) =>
      why === null ? group : { ...group, reason: why },
    );
    const saved = await settings.mutateAsync({
      groups: [...kept, { label, overlap: startingOverlap, reason }],
      reason: `May count twice. ${reason}`,
    });
    const known = new Set(groups.map(({ id }) => id));
    const made = saved.groups.find(({ id }) => !known.has(id));
    if (!made) throw new Error('the new group was not saved');
    return made.id;
  }
}
