import { useLedger } from '../ledger/ledger-context';
import { blanksOf } from '../model/blank-rows';
import { counted } from '../../../lib/words';

/** What a contributor has still blank, as a way to the next row. */
export function LeftToJudge() {
  const { saved: differential, canJudge, open, unsaved } = useLedger();
  const { mine } = differential;
  if (!canJudge || !mine) return null;
  const blanks = blanksOf(mine, differential.findings);
  const next = blanks.rows[0];
  return (
    <div className="side-about">
      <p>
        You judged {blanks.judged} of {counted(blanks.total, 'row')}.
        {unsaved.size > 0 && ` ${counted(unsaved.size, 'row is', 'rows are')} typed and not saved.`}
      </p>
      {next && (
        <button
          type="button"
          className="text-button"
          onClick={() => {
            open({ kind: 'row', findingId: next.id, at: null });
          }}
        >
          Judge the next blank row: {next.title}
        </button>
      )}
    </div>
  );
}
