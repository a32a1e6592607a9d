import { Button } from '@radix-ui/themes';
import type { ReactNode } from 'react';

interface Props {
  /** What the other person's save made of it. */
  theirs: ReactNode;
  /** What stands here unsaved. */
  mine: ReactNode;
  onKeepMine: () => void;
  onTakeTheirs: () => void;
  what?: string;
}

/** Two people at once: both texts side by side, and the choice. Nothing is thrown away before it is made. */
export function BothTexts({ theirs, mine, onKeepMine, onTakeTheirs, what = 'this' }: Props) {
  return (
    <section className="both-texts" role="alert" aria-label="Somebody else changed it meanwhile">
      <p className="failure-title">Somebody else changed {what} while you were writing. Choose what stays.</p>
      <div className="both-columns">
        <div>
          <p className="row-title">Yours, not saved yet</p>
          {mine}
          <Button onClick={onKeepMine}>Keep mine</Button>
        </div>
        <div>
          <p className="row-title">Saved meanwhile</p>
          {theirs}
          <Button variant="outline" onClick={onTakeTheirs}>
            Take theirs
          </Button>
        </div>
      </div>
    </section>
  );
}
