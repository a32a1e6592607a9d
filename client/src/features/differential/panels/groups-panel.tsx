import { DoubleCounting } from '../double-counting/double-counting';
import { GroupsForm } from '../evidence/groups-form';
import { useLedger } from '../ledger/ledger-context';
import { useChangeSettings } from '../api/change-settings';
import { SideHeading } from './side-panel';

/** The groups of findings that one mechanism explains; the chair changes them with a reason. */
export function GroupsPanel() {
  const { saved: differential, may } = useLedger();
  const change = useChangeSettings(differential.caseId);
  return (
    <>
      <SideHeading>Findings that overlap</SideHeading>
      <p className="side-about">
        Findings that one mechanism explains would be counted several times over. Overlap says how far: 0 for
        separate mechanisms, 100 for the same finding twice. A finding joins a group where the finding is
        changed.
      </p>
      <DoubleCounting />
      {may('settings.change') ? (
        <GroupsForm
          groups={differential.settings.groups}
          findings={differential.findings}
          onSave={(groups, reason) => change.mutateAsync({ groups, reason })}
        />
      ) : (
        <GroupsList />
      )}
    </>
  );
}

function GroupsList() {
  const { groups } = useLedger().saved.settings;
  if (groups.length === 0) return <p className="soft">No groups. The chair makes them.</p>;
  return (
    <ul className="side-list">
      {groups.map((group) => (
        <li key={group.id}>
          {group.label}, overlap {Math.round(group.overlap * 100)} of 100
          {group.reason !== null && group.reason !== '' && <span className="soft">. {group.reason}</span>}
        </li>
      ))}
    </ul>
  );
}
