import type { Plan } from '@weighhouse/shared/contracts/plans';
import { useState } from 'react';
import { Button } from '@radix-ui/themes';
import { WordsForm } from '../../../components/words-form';
import { useFormat } from '../../../lib/use-format';
import { useReportAction } from '../api/report-action';
import { lateWords } from '../model/plan-words';
import { PlanPart } from './plan-text';

type Action = Plan['actions'][number];

interface Props {
  caseId: string;
  actions: readonly Action[];
  /** The plan is signed: actions are carried out, their owners report them done. */
  signed?: boolean;
  /** Who reads it; their own open actions can be reported. */
  meId?: string;
}

/** Actions as a table: what, who, by when, and what came of it. Rows become cards on a phone. */
export function ActionList({ caseId, actions, signed = false, meId }: Props) {
  return (
    <PlanPart title="Actions">
      {actions.length === 0 ? (
        <p className="soft">No action is planned.</p>
      ) : (
        <table className="action-table">
          <thead>
            <tr>
              <th scope="col">What</th>
              <th scope="col">Who</th>
              <th scope="col">By when</th>
              {signed && <th scope="col">Done</th>}
            </tr>
          </thead>
          <tbody>
            {actions.map((action) => (
              <ActionRow
                key={action.id}
                caseId={caseId}
                action={action}
                signed={signed}
                mine={action.owner?.id === meId}
              />
            ))}
          </tbody>
        </table>
      )}
    </PlanPart>
  );
}

function ActionRow({
  caseId,
  action,
  signed,
  mine,
}: {
  caseId: string;
  action: Action;
  signed: boolean;
  mine: boolean;
}) {
  const [reporting, setReporting] = useState(false);
  const report = useReportAction(caseId, action.id);
  const canReport = signed && mine && action.doneAt === null;
  return (
    <>
      <tr>
        <td>
          {action.what}
          {action.concernsPatient && (
            <span className="soft small action-told">The patient is told of it.</span>
          )}
        </td>
        <td data-label="Who">{action.owner?.name ?? <span className="soft">Nobody yet</span>}</td>
        <td data-label="By when" className="action-due">
          <Due action={action} />
        </td>
        {signed && (
          <td data-label="Done">
            <Done action={action} />
            {canReport && !reporting && (
              <Button
                variant="outline"
                size="1"
                className="no-print"
                onClick={() => {
                  setReporting(true);
                }}
              >
                Report it done<span className="aside-text"> {action.what}</span>
              </Button>
            )}
          </td>
        )}
      </tr>
      {canReport && reporting && (
        <tr className="no-print">
          <td colSpan={4} className="action-report">
            <WordsForm
              keptKey={`action.${action.id}`}
              label={`What was done, and what came of it: ${action.what}`}
              verb="Report it done"
              onSend={report.mutateAsync}
              onClose={() => {
                setReporting(false);
              }}
            />
          </td>
        </tr>
      )}
    </>
  );
}

function Due({ action }: { action: Action }) {
  const format = useFormat();
  if (action.due === null) return <span className="soft">No date yet</span>;
  const late = action.doneAt === null ? lateWords(action.due, format.today()) : null;
  return (
    <>
      {format.date(action.due)}
      {late !== null && <span className="late action-told"> {late}</span>}
    </>
  );
}

function Done({ action }: { action: Action }) {
  const format = useFormat();
  if (action.doneAt === null) return <span className="soft">Not yet</span>;
  return (
    <>
      {format.day(action.doneAt)}
      {action.doneWords !== null && <span className="action-told plan-words">{action.doneWords}</span>}
    </>
  );
}
