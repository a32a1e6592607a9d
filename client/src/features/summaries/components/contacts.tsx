import { Button } from '@radix-ui/themes';
import type { Summary } from '@weighhouse/shared/contracts/summaries';
import { useState } from 'react';
import { ContactForm } from './contact-form';
import { ContactLog } from './contact-log';

/** The contact log, and what the liaison adds to it: an attempt at any time, the telling only after approval. */
export function Contacts({ summary }: { summary: Summary }) {
  const [form, setForm] = useState<'told' | 'other' | null>(null);
  const { caseId, state, contacts, abilities } = summary;
  const mayTell = abilities.includes('summary.tell') && (state === 'approved' || state === 'told');
  const mayLog = abilities.includes('summary.tell');
  return (
    <section className="tell-part no-print" aria-labelledby="contact-log">
      <h2 id="contact-log">Contacts with the patient</h2>
      {mayLog && form === null && (
        <div className="actions">
          {mayTell && (
            <Button
              variant={state === 'told' ? 'outline' : 'solid'}
              onClick={() => {
                setForm('told');
              }}
            >
              {state === 'told' ? 'Tell again' : 'Tell'}
            </Button>
          )}
          <Button
            variant="outline"
            onClick={() => {
              setForm('other');
            }}
          >
            Log an attempt
          </Button>
        </div>
      )}
      {mayLog && !mayTell && (
        <p className="soft small">Telling opens when the chair has approved the summary.</p>
      )}
      {form !== null && (
        <div className="tell-form">
          <h3>{form === 'told' ? 'The summary is told in this contact' : 'A contact or an attempt'}</h3>
          <ContactForm
            key={form}
            caseId={caseId}
            telling={form === 'told'}
            onClose={() => {
              setForm(null);
            }}
          />
        </div>
      )}
      <ContactLog contacts={contacts} />
    </section>
  );
}
