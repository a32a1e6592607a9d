import { Button } from '@radix-ui/themes';
import type { Settings } from '@weighhouse/shared/contracts/cases';
import type { Finding } from '@weighhouse/shared/contracts/findings';
import { useState } from 'react';
import { ErrorSummary } from '../../../components/error-summary';
import { FailureLine } from '../../../components/failure';
import { isApiError } from '../../../lib/api-error';
import { useAddFinding } from '../../findings/api/add-finding';
import { useChangeFinding } from '../../findings/api/change-finding';
import { FindingBothTexts } from './finding-both-texts';
import { FindingFields } from './finding-fields';
import { changeBody, emptyFinding, faultsOf, type FindingValues, newBody, valuesOf } from './finding-values';
import { SourceFields } from './source-fields';
import { StateFields } from './state-fields';
import './findings.css';

interface Props {
  caseId: string;
  /** The finding to change; null adds one. */
  finding: Finding | null;
  groups: Settings['groups'];
  /** The report that is being read, to begin from. */
  fromReport?: { reportId: string | null; page: number | null } | null;
  onDone: (findingId: string) => void;
  onCancel: () => void;
}

const labels = {
  title: 'Finding',
  detail: 'Detail',
  kind: 'Where it comes from',
  levelLabels: 'Levels',
  observed: 'What is known',
  reliability: 'How far the report can be trusted',
  observedOn: 'Date',
  'source.page': 'Page',
  'source.text': 'Source in words',
  cost: 'Cost',
  waitDays: 'Wait',
  burden: 'Burden',
};

/** Adds or changes a finding. */
export function FindingForm({ caseId, finding, groups, fromReport, onDone, onCancel }: Props) {
  const add = useAddFinding(caseId);
  const change = useChangeFinding(caseId);
  // What the form began from: a later version of somebody else is shown beside it, never taken over silently.
  const [base, setBase] = useState(finding);
  const [values, setValues] = useState<FindingValues>(() =>
    finding
      ? valuesOf(finding)
      : {
          ...emptyFinding,
          reportId: fromReport?.reportId ?? '',
          page: fromReport?.page == null ? '' : String(fromReport.page),
        },
  );
  const [tried, setTried] = useState(false);
  const own = tried ? faultsOf(values) : [];
  const error = finding ? change.error : add.error;
  const faults = own.length > 0 ? own : isApiError(error) ? error.fields : [];
  const stale =
    isApiError(change.error, 'stale') &&
    finding !== null &&
    base !== null &&
    finding.version !== base.version;
  const set = (more: Partial<FindingValues>) => {
    setValues((known) => ({ ...known, ...more }));
  };

  const send = async (version: number | undefined) => {
    setTried(true);
    if (faultsOf(values).length > 0) return;
    try {
      const saved =
        finding && version !== undefined
          ? await change.mutateAsync({ findingId: finding.id, ...changeBody(values, version) })
          : await add.mutateAsync(newBody(values));
      onDone(saved.id);
    } catch {
      // The mutation holds the error for the screen; the form stays as it is.
    }
  };

  return (
    <form
      className="finding-form"
      noValidate
      onSubmit={(event) => {
        event.preventDefault();
        void send(base?.version);
      }}
    >
      <ErrorSummary faults={faults} labels={labels} />
      <FindingFields values={values} set={set} faults={faults} groups={groups} />
      <StateFields values={values} set={set} faults={faults} />
      <SourceFields caseId={caseId} values={values} set={set} faults={faults} />
      {stale && (
        <FindingBothTexts
          mine={values}
          theirs={valuesOf(finding)}
          onKeepMine={() => {
            setBase(finding);
            void send(finding.version);
          }}
          onTakeTheirs={() => {
            setBase(finding);
            setValues(valuesOf(finding));
            change.reset();
          }}
        />
      )}
      {!stale && faults.length === 0 && <FailureLine error={error} />}
      <div className="actions">
        <Button type="submit" loading={add.isPending || change.isPending}>
          {finding ? 'Save finding' : 'Add finding'}
        </Button>
        <Button type="button" variant="outline" onClick={onCancel}>
          Cancel
        </Button>
      </div>
    </form>
  );
}
