import { Button } from '@radix-ui/themes';
import type { Case } from '@weighhouse/shared/contracts/cases';
import { type ReactNode, useState } from 'react';
import { Link, useNavigate } from 'react-router-dom';
import { ConfirmDialog } from '../../../components/confirm-dialog';
import { useMoveCase } from '../api/move-case';

type WordMove = 'return' | 'decline' | 'reopen' | 'withdraw';

interface Asked {
  move: WordMove;
  needs: string;
  button: string;
  title: string;
  verb: string;
  wordsLabel: string;
  danger?: boolean;
  text: string;
}

/** The moves that need words, in the order they stand in. */
const moves: Asked[] = [
  {
    move: 'return',
    needs: 'case.return',
    button: 'Return',
    title: 'Return the case with a question?',
    verb: 'Return with this question',
    wordsLabel: 'What the referrer should add or answer',
    text: 'The referrer gets the case back as a draft, with your words on top, and can submit it again.',
  },
  {
    move: 'decline',
    needs: 'case.decline',
    button: 'Decline',
    title: 'Decline this case?',
    verb: 'Decline the case',
    wordsLabel: 'Why, and your advice if there is any',
    danger: true,
    text: 'The referrer reads your words. A declined case is closed and cannot be opened again.',
  },
  {
    move: 'reopen',
    needs: 'case.reopen',
    button: 'Reopen',
    title: 'Reopen this case?',
    verb: 'Reopen the case',
    wordsLabel: 'What has changed',
    text: 'It goes back to judging. The signed plan stays as it is; the next one is a later version.',
  },
  {
    move: 'withdraw',
    needs: 'case.withdraw',
    button: 'Withdraw',
    title: 'Withdraw this case?',
    verb: 'Withdraw the case',
    wordsLabel: 'Why',
    danger: true,
    text: 'It is frozen at once, and only you can still read it. Owners keep their actions. This cannot be undone.',
  },
];

/** What this person may do with the case as a whole. What the server would refuse is not offered. */
export function CaseActions({ of }: { of: Case }) {
  const [asked, setAsked] = useState<Asked | null>(null);
  const move = useMoveCase(of.id);
  const navigate = useNavigate();
  const may = (action: string) => of.abilities.includes(action);
  const accepting = may('case.accept');
  return (
    <div className="actions">
      {accepting && (
        <Button asChild>
          <Link to={`/cases/${of.id}/team`}>Accept with a team</Link>
        </Button>
      )}
      {moves
        .filter(({ needs }) => may(needs))
        .map((one) => (
          <Quiet
            key={one.move}
            onClick={() => {
              setAsked(one);
            }}
          >
            {one.button}
          </Quiet>
        ))}
      {may('team.set') && !accepting && (
        <Quiet asChild>
          <Link to={`/cases/${of.id}/team`}>Team</Link>
        </Quiet>
      )}
      {may('settings.change') && (
        <Quiet asChild>
          <Link to={`/cases/${of.id}/settings`}>Settings</Link>
        </Quiet>
      )}
      {asked && (
        <ConfirmDialog
          open
          onOpenChange={() => {
            setAsked(null);
          }}
          title={asked.title}
          verb={asked.verb}
          danger={asked.danger ?? false}
          wordsLabel={asked.wordsLabel}
          onConfirm={async ({ words }) => {
            const moved = await move.mutateAsync({ move: asked.move, body: { words } });
            // A chair who returned or declined a case is not on its team and cannot read it any more.
            if (moved.parts.length === 0) await navigate('/');
          }}
        >
          {asked.text}
        </ConfirmDialog>
      )}
    </div>
  );
}

function Quiet(props: { children: ReactNode; onClick?: () => void; asChild?: boolean }) {
  return <Button variant="outline" color="gray" highContrast {...props} />;
}
