import { useState } from 'react';
import { Button } from '@radix-ui/themes';
import { useLedger } from '../ledger/ledger-context';
import type { Column } from '../model/columns';
import { AgendaNoteForm } from './agenda-note-form';
import type { DiscussRow } from './discuss-rows';
import { apartSentence, swingSentence } from './discuss-words';
import { TakeOffAgenda } from './take-off-agenda';

interface Props {
  row: DiscussRow;
  /** The column that leads now, where anything is shown. */
  leader: Column | undefined;
}

/** One row to discuss: why, and what the chair noted. */
export function DiscussLine({ row, leader }: Props) {
  const { columns, may, open } = useLedger();
  const [writing, setWriting] = useState(false);
  const { finding, item } = row;
  const sentences = [apartSentence(row, columns), leader ? swingSentence(row, leader) : null];
  return (
    <li>
      <button
        type="button"
        className="discuss-title"
        onClick={() => {
          open({ kind: 'row', findingId: finding.id, at: null });
        }}
      >
        {finding.title}
      </button>
      {item && !writing && <p className="discuss-note">{item.note}</p>}
      <p className="small soft">{sentences.filter((sentence) => sentence !== null).join(' ')}</p>
      {writing && (
        <AgendaNoteForm
          finding={finding}
          item={item}
          onClose={() => {
            setWriting(false);
          }}
        />
      )}
      {may('agenda.change') && !writing && finding.enteredInError === null && (
        <p className="actions no-print">
          <Button
            variant="outline"
            size="1"
            aria-label={`${item ? 'Change the note on' : 'Put on the agenda:'} ${finding.title}`}
            onClick={() => {
              setWriting(true);
            }}
          >
            {item ? 'Change the note' : 'Put on the agenda'}
          </Button>
          {item && <TakeOffAgenda finding={finding} item={item} />}
        </p>
      )}
    </li>
  );
}
