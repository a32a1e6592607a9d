import { Button, Dialog } from '@radix-ui/themes';
import type { Mine } from '@weighhouse/shared/contracts/differential';
import type { Round } from '@weighhouse/shared/contracts/rounds';
import { useState } from 'react';
import { FailureLine } from '../../../components/failure';
import { isApiError } from '../../../lib/api-error';
import { counted } from '../../../lib/words';
import { useHandIn } from '../api/hand-in';
import { useLedger } from '../ledger/ledger-context';
import { blanksOf } from '../model/blank-rows';

interface Props {
  open: boolean;
  onOpenChange: (open: boolean) => void;
  round: Round;
  mine: Mine;
}

/** Hands in, after saying what is still blank; then shows the seal's digest. */
export function HandInDialog({ open, onOpenChange, round, mine }: Props) {
  return (
    <Dialog.Root open={open} onOpenChange={onOpenChange}>
      <Dialog.Content className="ledger-dialog" aria-describedby={undefined}>
        <HandInForm
          round={round}
          mine={mine}
          onClose={() => {
            onOpenChange(false);
          }}
        />
      </Dialog.Content>
    </Dialog.Root>
  );
}

function HandInForm({
  round,
  mine,
  onClose,
}: Omit<Props, 'open' | 'onOpenChange'> & { onClose: () => void }) {
  const { saved: differential } = useLedger();
  const handIn = useHandIn(differential.caseId);
  const [noMore, setNoMore] = useState(false);
  const blanks = blanksOf(mine, differential.findings);
  if (handIn.data) return <HandedIn digest={handIn.data.digest} kind={round.kind} onClose={onClose} />;
  const cannot = (blanks.priorMissing || blanks.underHalf) && !noMore;
  return (
    <>
      <Dialog.Title size="4">Hand in your judgement of round {round.number}</Dialog.Title>
      <p className="dialog-words">
        {round.kind === 'sealed'
          ? 'It gets a seal and stays as it is. Nobody sees your numbers before the chair unseals the round; the seal’s digest is shown to the team at once.'
          : 'It gets a seal; its digest is shown to the team.'}
      </p>
      <Blanks />
      {(blanks.priorMissing || blanks.underHalf) && (
        <label className="check-line">
          <input
            type="checkbox"
            checked={noMore}
            onChange={(event) => {
              setNoMore(event.target.checked);
            }}
          />
          Nothing more will come from me in this round
        </label>
      )}
      <FailureLine error={handIn.error} />
      {isApiError(handIn.error) && handIn.error.fields.length > 0 && (
        <ul className="plain-list">
          {handIn.error.fields.map((fault) => (
            <li key={fault.path + fault.message}>{fault.message}</li>
          ))}
        </ul>
      )}
      <div className="actions dialog-actions">
        <Button
          disabled={cannot}
          loading={handIn.isPending}
          onClick={() => {
            handIn.mutate({ roundId: round.id, version: mine.version, ...(noMore ? { noMore } : {}) });
          }}
        >
          Hand in
        </Button>
        <Dialog.Close>
          <Button variant="outline">Go on judging</Button>
        </Dialog.Close>
      </div>
    </>
  );
}

/** What is missing, all of it by name. */
function Blanks() {
  const { saved: differential, unsaved, rows } = useLedger();
  const { mine } = differential;
  if (!mine) return null;
  const blanks = blanksOf(mine, differential.findings);
  const typed = rows.filter((row) => unsaved.has(row.id)).map((row) => row.title);
  const lists = [
    {
      title: `${counted(blanks.rows.length, 'row is', 'rows are')} blank`,
      items: blanks.rows.map((row) => row.title),
    },
    {
      title: `${counted(blanks.partly.length, 'row is', 'rows are')} partly blank`,
      items: blanks.partly.map((row) => row.title),
    },
    {
      title: `${counted(typed.length, 'row is', 'rows are')} typed and not saved: that is not handed in`,
      items: typed,
    },
  ].filter((list) => list.items.length > 0);
  return (
    <div className="blanks">
      {blanks.priorMissing && <p>You have not given a prior for the candidates in force.</p>}
      {lists.length === 0 && !blanks.priorMissing && (
        <p>Nothing is blank. All {counted(blanks.total, 'row')} are judged.</p>
      )}
      {lists.map((list) => (
        <div key={list.title}>
          <h2>{list.title}</h2>
          <ul className="plain-list">
            {list.items.map((item) => (
              <li key={item}>{item}</li>
            ))}
          </ul>
        </div>
      ))}
      {blanks.underHalf && <p>You have judged less than half of the rows.</p>}
    </div>
  );
}

function HandedIn({ digest, kind, onClose }: { digest: string; kind: Round['kind']; onClose: () => void }) {
  return (
    <>
      <Dialog.Title size="4">Your judgement is handed in</Dialog.Title>
      <p className="dialog-words">
        This is the digest of your seal. The team sees it too. {kind === 'sealed' && 'After the unsealing'}
        {kind === 'live' && 'From now on'} “Verify seals” shows that nothing was changed.
      </p>
      <code className="figures digest-whole">{digest}</code>
      <div className="actions dialog-actions">
        <Button onClick={onClose}>Back to the ledger</Button>
      </div>
    </>
  );
}
