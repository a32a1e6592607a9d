import { Button } from '@radix-ui/themes';
import type { Finding } from '@weighhouse/shared/contracts/findings';
import { Link } from 'react-router-dom';
import { useFormat } from '../../../lib/use-format';
import { OnAgenda } from '../discuss/on-agenda';
import { ApartNote } from '../editor/apart-note';
import { RowEditor } from '../editor/row-editor';
import { EnteredInErrorButton } from '../evidence/entered-in-error-button';
import { useLedger } from '../ledger/ledger-context';
import { dayWords } from '../model/day-words';
import { effortWords, reliabilityWord, sourceWords, stateWords } from '../model/finding-words';
import { WithoutButton } from '../without/without-button';
import { CellList } from './cell-list';
import { RowVoices } from './row-voices';
import { SideHeading } from './side-panel';

/** One finding at the side: what it is, one's own judgement of it, and where the panel is apart. */
export function RowPanel({ findingId }: { findingId: string }) {
  const { rows, canJudge, may, open, differential } = useLedger();
  const index = rows.findIndex((row) => row.id === findingId);
  const finding = rows[index];
  if (!finding) return <p className="soft">This finding is not there any more.</p>;
  const changeable = may('finding.change') && !finding.enteredInError;
  const step = (by: number) => () => {
    const next = rows[index + by];
    if (next) open({ kind: 'row', findingId: next.id, at: null });
  };
  return (
    <>
      <SideHeading>{finding.title}</SideHeading>
      <About finding={finding} />
      <OnAgenda finding={finding} />
      {canJudge && !finding.enteredInError ? <RowEditor finding={finding} /> : <CellList finding={finding} />}
      {!canJudge && differential.sealed && differential.mine?.handedInAt && (
        <p className="note">
          You handed in. Your numbers stay as they are until the chair unseals the round.
        </p>
      )}
      <ApartNote finding={finding} />
      <WithoutButton left={{ kind: 'finding', id: finding.id }} name={`“${finding.title}”`} />
      <RowVoices finding={finding} />
      <div className="actions side-actions">
        <Button variant="outline" disabled={index === 0} onClick={step(-1)}>
          Row before
        </Button>
        <Button variant="outline" disabled={index === rows.length - 1} onClick={step(1)}>
          Next row
        </Button>
        {!finding.enteredInError && (
          <Button
            variant="outline"
            onClick={() => {
              open({ kind: 'trial', findingId: finding.id });
            }}
          >
            What if
          </Button>
        )}
        {changeable && (
          <Button
            variant="outline"
            onClick={() => {
              open({ kind: 'finding', findingId: finding.id });
            }}
          >
            Change finding
          </Button>
        )}
        {changeable && <EnteredInErrorButton caseId={differential.caseId} finding={finding} />}
      </div>
    </>
  );
}

function About({ finding }: { finding: Finding }) {
  const { differential } = useLedger();
  const format = useFormat();
  const group = differential.settings.groups.find((one) => one.id === finding.groupId);
  const { source } = finding;
  const from = sourceWords(finding);
  const to =
    source?.reportId == null
      ? null
      : `/cases/${differential.caseId}/reports?report=${source.reportId}${source.page === null ? '' : `&page=${String(source.page)}`}`;
  const report =
    source?.fileName == null
      ? null
      : source.page === null
        ? source.fileName
        : `${source.fileName}, page ${String(source.page)}`;
  return (
    <div className="side-about">
      <p>
        {finding.observed === null || finding.enteredInError
          ? `${stateWords(finding)}.`
          : `${stateWords(finding)} in this patient.`}
        {from !== null && (to === null || source?.text) ? ` ${from}.` : ''}
        {to !== null && report !== null && (
          <>
            {' '}
            From <Link to={to}>{report}</Link>.
          </>
        )}
        {finding.observedOn !== null && ` ${dayWords(format)(finding.observedOn)}.`}
        {finding.reliability < 0.995 && ` The report of it is ${reliabilityWord(finding.reliability)}.`}
        {group && ` Overlaps with the group “${group.label}”.`}
        {effortWords(finding).length > 0 && ` To find out: ${effortWords(finding).join(', ')}.`}
      </p>
      {finding.detail !== '' && <p className="side-detail">{finding.detail}</p>}
      {finding.enteredInError && (
        <p>
          {finding.enteredInError.by}, {format.moment(finding.enteredInError.at)}:{' '}
          {finding.enteredInError.words}
        </p>
      )}
    </div>
  );
}
