import type { Summary } from '@weighhouse/shared/contracts/summaries';
import { useFormat } from '../../../lib/use-format';
import { howWords, understoodWords } from '../model/summary-words';

/** When and how the patient was reached, newest first. */
export function ContactLog({ contacts }: { contacts: Summary['contacts'] }) {
  const format = useFormat();
  if (contacts.length === 0) return <p className="soft">Nobody has tried to reach the patient yet.</p>;
  // The server has them oldest first; of two in the same minute the later one is first here.
  const newestFirst = contacts.toReversed().sort((one, other) => Date.parse(other.at) - Date.parse(one.at));
  return (
    <ol className="contact-log">
      {newestFirst.map((contact) => (
        <li key={contact.id}>
          <p>
            <b>
              {contact.told ? 'Told' : contact.reached ? 'Reached' : 'Not reached'},{' '}
              {format.moment(contact.at)}
            </b>
          </p>
          <p className="soft">
            {howWords[contact.how] ?? contact.how}, {contact.by}.
            {contact.understood !== null && ` ${understoodWords[contact.understood]}.`}
          </p>
          {contact.questions !== '' && (
            <p className="contact-words">
              <span className="soft">Asked: </span>
              {contact.questions}
            </p>
          )}
          {contact.notes !== '' && (
            <p className="contact-words">
              <span className="soft">Notes: </span>
              {contact.notes}
            </p>
          )}
        </li>
      ))}
    </ol>
  );
}
