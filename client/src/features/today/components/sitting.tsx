import type { Today } from '@weighhouse/shared/contracts/today';
import { Link } from 'react-router-dom';
import { capital } from '../../../lib/words';
import { useFormat } from '../../../lib/use-format';
import { LeaderBar } from '../../../components/leader-bar';

/** The cases a person sits on, with where each stands and when it is discussed. */
export function Sitting({ today }: { today: Today }) {
  const format = useFormat();
  if (today.cases.length === 0) return null;
  return (
    <section aria-labelledby="sitting">
      <div className="section-head">
        <h2 id="sitting">Cases you sit on</h2>
        <span className="soft small">
          {today.cases.length} open, {today.closedThisMonth} closed this month
        </span>
      </div>
      <ul className="today-list">
        {today.cases.map((one) => (
          <li key={one.id} className="today-row">
            <span className="figures today-number">{one.number}</span>
            <div>
              <p className="row-title">
                <Link to={`/cases/${one.id}`}>{one.question}</Link>
              </p>
              <p className="soft small">{capital(one.detail)}</p>
            </div>
            <LeaderBar leader={one.leader} />
            <span className="soft small today-date">
              {one.conferenceAt === null ? 'no date yet' : format.weekday(one.conferenceAt)}
            </span>
          </li>
        ))}
      </ul>
    </section>
  );
}
