import { Button } from '@radix-ui/themes';
import { useFormat } from '../../../lib/use-format';
import { useLedger } from '../ledger/ledger-context';
import { roundTitle } from '../model/round-words';
import { WithoutPerson } from '../without/without-person';
import { LeftToJudge } from './left-to-judge';
import { SideHeading } from './side-panel';

/** The round: who is in and with which seal. What stands at the side while nothing is opened. */
export function RoundPanel() {
  const { differential, open, may } = useLedger();
  const format = useFormat();
  const { round } = differential;
  if (!round)
    return (
      <>
        <SideHeading>No round yet</SideHeading>
        <p className="soft">
          {may('round.open')
            ? 'Opening the first round needs two candidates and three findings. It is a sealed one: nobody sees anybody’s numbers until you unseal it.'
            : 'The chair opens the first round when candidates and findings are there. Until then findings can be added and corrected.'}
        </p>
      </>
    );
  return (
    <>
      <SideHeading>{roundTitle(round)}</SideHeading>
      <p className="side-about">
        Opened {format.moment(round.openedAt)}.
        {round.deadline !== null && ` Hand in by ${format.moment(round.deadline)}.`}
        {round.unsealedAt !== null && ` Unsealed ${format.moment(round.unsealedAt)}.`}
        {round.unsealReason !== null &&
          round.unsealReason !== '' &&
          ` Below the quorum, because: ${round.unsealReason}.`}
        {round.closedAt !== null && ` Closed ${format.moment(round.closedAt)}.`}
      </p>
      <LeftToJudge />
      <h3 className="side-sub">Who is in</h3>
      <ul className="members">
        {round.members.map(({ person, handedInAt, digest }) => (
          <li key={person.id}>
            <span>
              {person.name}
              {person.specialty !== '' && <span className="soft">, {person.specialty}</span>}
            </span>
            <span className="small soft">
              {handedInAt === null ? 'not handed in' : `handed in ${format.moment(handedInAt)}`}
            </span>
            <WithoutPerson personId={person.id} name={person.name} />
            {digest !== null && <Digest digest={digest} />}
          </li>
        ))}
      </ul>
      {(may('seal.verify') || may('seal.read')) && (
        <Button
          variant="outline"
          className="no-print"
          onClick={() => {
            open({ kind: 'seals' });
          }}
        >
          Verify seals
        </Button>
      )}
    </>
  );
}

/** The digest of a seal: its beginning at a glance, all of it on demand. */
export function Digest({ digest }: { digest: string }) {
  return (
    <details className="digest">
      <summary>
        Seal <span className="figures">{digest.slice(0, 12)}…</span>
      </summary>
      <code className="figures">{digest}</code>
    </details>
  );
}
