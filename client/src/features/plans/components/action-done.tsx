import { Button, TextArea } from '@radix-ui/themes';
import { type Plan, actionDoneSchema } from '@weighhouse/shared/contracts/plans';
import type { FieldFault } from '@weighhouse/shared/contracts/errors';
import { z } from 'zod';
import { type SubmitEvent, useState } from 'react';
import { FailureLine } from '../../../components/failure';
import { faultsIn } from '../../../components/faults';
import { FormField } from '../../../components/form-field';
import { useReportAction } from '../api/report-action';
import { useKept } from '../../../lib/use-kept';

interface Props {
  caseId: string;
  action: Plan['actions'][number];
  onClose: () => void;
}

/** The owner's report: what was done and what came of it. */
export function ActionDone({ caseId, action, onClose }: Props) {
  const [words, setWords, clear] = useKept(`action.${action.id}`, z.string(), '');
  const [faults, setFaults] = useState<FieldFault[]>([]);
  const report = useReportAction(caseId, action.id);
  const path = `done-${action.id}`;

  const send = (event: SubmitEvent) => {
    event.preventDefault();
    const found = faultsIn(actionDoneSchema, { words }).map((fault) => ({ ...fault, path }));
    setFaults(found);
    if (found.length > 0) return;
    report.mutate(words.trim(), {
      onSuccess: () => {
        clear();
        onClose();
      },
    });
  };

  return (
    <form onSubmit={send}>
      <FormField label={`What came of it: ${action.what}`} path={path} faults={faults}>
        {(control) => (
          <TextArea
            {...control}
            autoFocus
            rows={3}
            maxLength={4000}
            value={words}
            onChange={(event) => {
              setWords(event.target.value);
            }}
          />
        )}
      </FormField>
      <FailureLine error={report.error} />
      <div className="actions">
        <Button type="submit" loading={report.isPending}>
          Report it done
        </Button>
        <Button type="button" variant="outline" onClick={onClose}>
          Not now
        </Button>
      </div>
    </form>
  );
}
