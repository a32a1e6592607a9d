import { Button } from '@radix-ui/themes';
import { useState } from 'react';
import { FailureLine } from '../../../components/failure';
import { useChangeSettings } from '../api/change-settings';
import { useLedger } from '../ledger/ledger-context';
import { PairForm } from './pair-form';
import { type Pair, pairSentence, withoutPair } from './pair-values';

/** Pairs of candidates that go together or avoid each other; the chair notes them, each with a reason. */
export function Pairs() {
  const { saved, may } = useLedger();
  const change = useChangeSettings(saved.caseId);
  const [editing, setEditing] = useState<Pair | 'new' | null>(null);
  const pairs = saved.settings.together;
  const mayChange = may('settings.change');
  const nameOf = (id: string) => {
    const candidate = saved.candidates.find((one) => one.id === id);
    return candidate ? `${candidate.name}${candidate.retired ? ' (retired)' : ''}` : 'a candidate';
  };
  const done = {
    onSuccess: () => {
      setEditing(null);
    },
  };
  return (
    <>
      <h3 className="side-sub">Pairs that go together or avoid each other</h3>
      {pairs.length === 0 && <p className="soft">None is noted.</p>}
      <ul className="pair-list">
        {pairs.map((pair) => {
          const sentence = pairSentence(nameOf(pair.a), nameOf(pair.b), pair.times);
          return (
            <li key={`${pair.a} ${pair.b}`}>
              <span>{sentence}.</span>
              <span className="small soft">{pair.reason}</span>
              {mayChange && (
                <span className="actions">
                  <button
                    type="button"
                    className="text-button"
                    aria-label={`Change: ${sentence}`}
                    onClick={() => {
                      setEditing(pair);
                    }}
                  >
                    Change
                  </button>
                  <button
                    type="button"
                    className="text-button"
                    aria-label={`Remove: ${sentence}`}
                    onClick={() => {
                      change.mutate(
                        { together: withoutPair(pairs, pair), reason: `Removed: ${sentence}` },
                        done,
                      );
                    }}
                  >
                    Remove
                  </button>
                </span>
              )}
            </li>
          );
        })}
      </ul>
      <FailureLine error={change.error} />
      {mayChange && editing === null && (
        <Button
          variant="outline"
          onClick={() => {
            setEditing('new');
          }}
        >
          Note a pair
        </Button>
      )}
      {mayChange && editing !== null && (
        <PairForm
          key={editing === 'new' ? 'new' : `${editing.a} ${editing.b}`}
          pairs={pairs}
          editing={editing === 'new' ? null : editing}
          busy={change.isPending}
          onSave={(together, reason) => {
            change.mutate({ together, reason }, done);
          }}
          onCancel={() => {
            setEditing(null);
          }}
        />
      )}
    </>
  );
}
