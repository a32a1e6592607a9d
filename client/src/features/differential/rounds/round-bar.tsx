import { Button } from '@radix-ui/themes';
import { type ReactNode, useState } from 'react';
import { useFormat } from '../../../lib/use-format';
import { useNow } from './use-now';
import { useLedger } from '../ledger/ledger-context';
import { roundCount, roundSentence, unsealHindrance } from '../model/round-words';
import { CloseRoundDialog } from './close-round-dialog';
import { HandInDialog } from './hand-in-dialog';
import { OpenRoundDialog } from './open-round-dialog';
import { UnsealDialog } from './unseal-dialog';

type Move = 'handIn' | 'open' | 'unseal' | 'close';

/** The line above the ledger: which round, how many are in, and what this person can do with it. */
export function RoundBar({ children }: { children?: ReactNode }) {
  const { saved: differential, may, open } = useLedger();
  const [move, setMove] = useState<Move | null>(null);
  const now = useNow();
  const { round, settings, mine } = differential;
  const count = round && roundCount(round, settings.quorum, now);
  const openNow = round?.state === 'open';
  const dialog = (name: Move) => ({
    open: move === name,
    onOpenChange: (next: boolean) => {
      setMove(next ? name : null);
    },
  });
  const button = (name: Move, words: string, primary: boolean) => (
    <Button
      variant={primary ? 'solid' : 'outline'}
      onClick={() => {
        setMove(name);
      }}
    >
      {words}
    </Button>
  );
  return (
    <div className="round-bar">
      <p className="round-line">
        <RoundLine />
      </p>
      <div className="actions no-print">
        {children}
        <Button
          variant="outline"
          onClick={() => {
            open({ kind: 'pooled' });
          }}
        >
          {differential.assessment ? 'How it was pooled' : 'How it is pooled'}
        </Button>
        {round && openNow && may('round.close') && button('close', 'Close the round', false)}
        {round &&
          openNow &&
          round.kind === 'sealed' &&
          may('round.unseal') &&
          button('unseal', 'Unseal', count?.quorumIn === true)}
        {may('round.open') && button('open', 'Open a round', true)}
        {round &&
          openNow &&
          mine &&
          may('judgement.handIn') &&
          mine.handedInAt === null &&
          button('handIn', 'Hand in', true)}
      </div>
      {round && mine && <HandInDialog {...dialog('handIn')} round={round} mine={mine} />}
      {round && count && (
        <UnsealDialog
          {...dialog('unseal')}
          round={round}
          count={count}
          hindrance={count.mayUnseal === 'no' ? unsealHindrance(count, round.deadline !== null) : null}
        />
      )}
      {round && <CloseRoundDialog {...dialog('close')} round={round} />}
      <OpenRoundDialog {...dialog('open')} />
    </div>
  );
}

/** What the case's header does not say: until when, whose numbers these are, and one's own hand-in. */
function RoundLine() {
  const { differential } = useLedger();
  const format = useFormat();
  const now = useNow();
  const { round, mine, sealed, assessment, shownRound } = differential;
  if (!round) return <>No round is open yet.</>;
  const parts = [roundSentence(round)];
  if (round.state === 'open' && round.deadline !== null) {
    const past = new Date(round.deadline) <= now;
    parts.push(
      past
        ? `The deadline was ${format.moment(round.deadline)}.`
        : `Hand in by ${format.moment(round.deadline)}.`,
    );
  }
  if (mine?.handedInAt) parts.push(`You handed in ${format.moment(mine.handedInAt)}.`);
  if (sealed && assessment && shownRound)
    parts.push(`The numbers below are those of round ${String(shownRound.number)}.`);
  return <>{parts.join(' ')}</>;
}
