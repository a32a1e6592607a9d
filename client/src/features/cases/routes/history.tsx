import '../components/history.css';
import type { Case } from '@weighhouse/shared/contracts/cases';
import { Link } from 'react-router-dom';
import { EmptyState } from '../../../components/empty-state';
import { RichTextView } from '../../../components/rich-text-view';
import { useFormat } from '../../../lib/use-format';
import { capital } from '../../../lib/words';
import { useCase, useCaseId } from '../api/get-case';
import { urgencyWords } from '../components/case-words';
import { TeamList } from '../components/team-list';

/** What the referrer wrote, with the facts of the referral beside it. */
export default function HistoryPage() {
  const { data } = useCase(useCaseId());
  if (!data) return null;
  return (
    <div className="page history">
      <section aria-label="History">
        {data.historyHtml === '' ? (
          <EmptyState
            title="No history is written yet."
            action={
              data.abilities.includes('case.edit') && <Link to={`/cases/${data.id}/edit`}>Write it</Link>
            }
          >
            The panel reads it before anything else.
          </EmptyState>
        ) : (
          <RichTextView html={data.historyHtml} />
        )}
      </section>
      <Facts of={data} />
    </div>
  );
}

function Facts({ of }: { of: Case }) {
  const format = useFormat();
  const { consent } = of;
  return (
    <aside aria-label="The referral and the team">
      <dl className="fact-list">
        <dt>Referred by</dt>
        <dd>
          {of.referrer.name}, {of.referrer.specialty}, {of.referrer.centre}
        </dd>
        {of.submittedAt !== null && (
          <>
            <dt>Submitted</dt>
            <dd>{format.moment(of.submittedAt)}</dd>
          </>
        )}
        <dt>Urgency</dt>
        <dd>
          {of.urgency === null ? 'not given' : capital(urgencyWords[of.urgency])}
          {of.urgencyReason !== '' && <p className="soft">{of.urgencyReason}</p>}
        </dd>
        <dt>Consent</dt>
        <dd>
          {consent?.given === true
            ? `${capital(consent.how)}, ${format.date(consent.givenOn)}`
            : 'not recorded'}
        </dd>
      </dl>
      <TeamList of={of} />
    </aside>
  );
}
