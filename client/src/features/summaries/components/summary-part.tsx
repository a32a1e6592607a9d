import { Button } from '@radix-ui/themes';
import type { Summary } from '@weighhouse/shared/contracts/summaries';
import { useState } from 'react';
import { Caution } from '../../../components/caution';
import { useFormat } from '../../../lib/use-format';
import { SummaryEditor } from './summary-editor';
import { SummaryText } from './summary-text';

/** The liaison's text in whatever state it is: written, waiting, approved, told. */
export function SummaryPart({ summary }: { summary: Summary }) {
  const { state, abilities, returnedWords } = summary;
  const [changing, setChanging] = useState(false);
  const mayWrite = abilities.includes('summary.write');
  const open = state === 'none' || state === 'draft' || changing;
  return (
    <section className="tell-part no-print" aria-labelledby="summary-part">
      <h2 id="summary-part">The summary in plain words</h2>
      {returnedWords !== null && open && (
        <div className="note">
          <p className="small soft">The chair asks for changes:</p>
          <p className="contact-words">{returnedWords}</p>
        </div>
      )}
      {mayWrite && open ? (
        <SummaryEditor
          summary={summary}
          onHandedOver={() => {
            setChanging(false);
          }}
        />
      ) : (
        <>
          {state === 'waiting' && (
            <p className="soft">Handed to the chair. You can tell the patient when it is approved.</p>
          )}
          <StateLine summary={summary} />
          <SummaryText body={summary.body} />
          <div className="actions">
            {mayWrite && (
              <Button
                variant="outline"
                onClick={() => {
                  setChanging(true);
                }}
              >
                Change the text
              </Button>
            )}
            {(state === 'approved' || state === 'told') && (
              <Button
                variant="outline"
                onClick={() => {
                  window.print();
                }}
              >
                Print it for the patient
              </Button>
            )}
          </div>
          {mayWrite && <p className="soft small">A changed text needs the chair’s approval again.</p>}
        </>
      )}
      <Caution />
    </section>
  );
}

/** Who approved it and when, and when it was told. */
export function StateLine({ summary }: { summary: Summary }) {
  const format = useFormat();
  const { approvedBy, approvedAt, toldAt } = summary;
  const words = [
    approvedAt === null
      ? ''
      : `Approved${approvedBy === null ? '' : ` by ${approvedBy}`}, ${format.moment(approvedAt)}.`,
    toldAt === null ? '' : `Told ${format.moment(toldAt)}.`,
  ].filter((part) => part !== '');
  return words.length === 0 ? null : <p className="soft">{words.join(' ')}</p>;
}
