import { Button, TextArea } from '@radix-ui/themes';
import type { Summary } from '@weighhouse/shared/contracts/summaries';
import { useMemo, useState } from 'react';
import { z } from 'zod';
import { BothTexts } from '../../../components/both-texts';
import { FailureLine } from '../../../components/failure';
import { FormField } from '../../../components/form-field';
import { SaveState } from '../../../components/save-state';
import type { DraftKind } from '../../../lib/draft-keeper';
import { useDraftKeeper } from '../../../lib/use-draft-keeper';
import { staleSummary, useSaveSummary } from '../api/save-summary';
import { lengthWords } from '../model/summary-words';
import { SummaryText } from './summary-text';

const keptSchema = z.object({ version: z.number(), value: z.string() });
const storedOf = ({ version, body }: Summary) => ({ version, value: body });

/** The liaison writes the summary beside a preview; it is saved while it is typed. */
export function SummaryEditor({ summary, onHandedOver }: { summary: Summary; onHandedOver: () => void }) {
  const { caseId, planNumber } = summary;
  const save = useSaveSummary(caseId);
  const stored = useMemo(() => storedOf(summary), [summary]);
  const kind = (): DraftKind<string> => ({
    keptKey: `summary.${caseId}.${String(planNumber)}`,
    readKept: (left) => keptSchema.safeParse(left).data ?? null,
    same: (one, other) => one.trim() === other.trim(),
    save: async (body, version) => storedOf(await save({ version, body: body.trim(), ready: false })),
    readTheirs: (error) => {
      const theirs = staleSummary(error);
      return theirs && storedOf(theirs);
    },
  });
  const { keeper, value, saving, error, theirs } = useDraftKeeper(kind, stored);
  const [failed, setFailed] = useState<unknown>(null);
  const [busy, setBusy] = useState(false);

  const handOver = async () => {
    setFailed(null);
    setBusy(true);
    try {
      if (!(await keeper.flush())) return;
      const { value: body, version } = keeper.read();
      await save({ version, body: body.trim(), ready: true });
      onHandedOver();
    } catch (refused) {
      setFailed(refused);
    } finally {
      setBusy(false);
    }
  };

  return (
    <>
      {theirs && (
        <BothTexts
          what="the summary"
          mine={<SummaryText body={value} />}
          theirs={<SummaryText body={theirs.value} />}
          onKeepMine={() => {
            keeper.keepMine();
          }}
          onTakeTheirs={() => {
            keeper.takeTheirs();
          }}
        />
      )}
      <div className="summary-work">
        <FormField
          label="The text"
          path="body"
          faults={error?.fields}
          hint="Short sentences, everyday words. An empty line begins a new paragraph."
        >
          {(control) => (
            <TextArea
              {...control}
              className="summary-input"
              maxLength={20_000}
              resize="vertical"
              value={value}
              onChange={(event) => {
                keeper.change(event.target.value);
              }}
            />
          )}
        </FormField>
        <section aria-label="As the patient reads it">
          <p className="preview-title">As the patient reads it</p>
          <SummaryText body={value} />
        </section>
      </div>
      <p className="summary-foot">
        <span className="soft small figures">{lengthWords(value)}</span> <SaveState saving={saving} />
      </p>
      {error && error.fields.length === 0 && error.status !== 0 && <FailureLine error={error} />}
      <FailureLine error={failed} />
      <div className="actions">
        <Button
          loading={busy}
          disabled={value.trim() === '' || theirs !== null}
          onClick={() => void handOver()}
        >
          Hand to the chair for approval
        </Button>
      </div>
    </>
  );
}
