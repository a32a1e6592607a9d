import './outcome.css';
import { Button } from '@radix-ui/themes';
import type { Outcome } from '@weighhouse/shared/contracts/outcomes';
import { useState } from 'react';
import { Failure } from '../../../components/failure';
import { SkeletonText } from '../../../components/skeleton';
import { useFormat } from '../../../lib/use-format';
import { useOutcome } from '../api/get-outcome';
import { OutcomeForm } from './outcome-form';

interface Props {
  caseId: string;
  /** The outcome can be recorded now, by this person. */
  mayRecord: boolean;
}

/** What the illness turned out to be, or the form that records it; nothing where neither applies. */
export function OutcomePanel({ caseId, mayRecord }: Props) {
  const { data, error, isPending, refetch } = useOutcome(caseId);
  const [writing, setWriting] = useState(false);
  if (isPending) return mayRecord ? <SkeletonText lines={2} /> : null;
  if (data === undefined)
    return <Failure error={error} what="The outcome could not be loaded." retry={() => void refetch()} />;
  if (!mayRecord) return data && <Recorded outcome={data} />;
  return (
    <>
      {data && <Recorded outcome={data} />}
      <section className="outcome no-print" aria-label="Record the outcome">
        <h2>
          {data
            ? 'The case was reopened and closed again since'
            : 'What it turned out to be is not known yet'}
        </h2>
        {writing ? (
          <OutcomeForm
            caseId={caseId}
            onClose={() => {
              setWriting(false);
            }}
          />
        ) : (
          <>
            <p className="soft prose">
              When the illness has a name, by a biopsy, a course of treatment or time, record it. The panel
              learns from it.
            </p>
            <div className="actions no-print">
              <Button
                variant="outline"
                onClick={() => {
                  setWriting(true);
                }}
              >
                Record the outcome
              </Button>
            </div>
          </>
        )}
      </section>
    </>
  );
}

function Recorded({ outcome }: { outcome: Outcome }) {
  const format = useFormat();
  return (
    <section className="outcome" aria-label="Outcome">
      <h2>It turned out to be {outcome.diagnosis}</h2>
      <dl>
        <dt>How it is known</dt>
        <dd className="outcome-words">{outcome.howKnown}</dd>
        <dt>Known since</dt>
        <dd>{format.date(outcome.knownOn)}</dd>
        <dt>On the differential</dt>
        <dd>
          {outcome.candidateId === null ? 'It was none of the candidates' : 'It was one of the candidates'}
        </dd>
        <dt>Recorded</dt>
        <dd>
          {outcome.recordedBy}, {format.moment(outcome.recordedAt)}
        </dd>
      </dl>
    </section>
  );
}
