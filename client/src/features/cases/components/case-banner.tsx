import type { Case } from '@weighhouse/shared/contracts/cases';
import { Link } from 'react-router-dom';
import { useFormat } from '../../../lib/use-format';
import './case-banner.css';

const titles: Partial<Record<Case['state'], string>> = {
  returned: 'Returned with a question',
  declined: 'Declined',
  withdrawn: 'Withdrawn',
};

/**
 * The words with which the case was returned, declined, withdrawn or reopened, while they still matter.
 * `quiet` leaves out the way to the referral, where one is there already.
 */
export function CaseBanner({ of, quiet = false }: { of: Case; quiet?: boolean }) {
  const format = useFormat();
  const { words } = of;
  const reopened = of.state === 'judging' && words?.move === 'reopened';
  const title = reopened ? 'Reopened' : titles[of.state];
  if (title === undefined && of.state !== 'draft') return null;
  return (
    <div className="case-banner">
      {title !== undefined && words && (
        <>
          <p className="failure-title">{title}</p>
          <p className="case-banner-words">{words.text}</p>
          <p className="soft small">
            {words.by}, {format.moment(words.at)}
          </p>
        </>
      )}
      {!quiet && of.abilities.includes('case.edit') && (
        <p>
          <Link to={`/cases/${of.id}/edit`}>
            {of.state === 'draft'
              ? 'This is a draft. Go on writing the referral'
              : 'Answer in the referral and submit it again'}
          </Link>
        </p>
      )}
    </div>
  );
}
