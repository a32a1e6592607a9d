import type { Today } from '@weighhouse/shared/contracts/today';
import { Link } from 'react-router-dom';
import { useFormat } from '../../../lib/use-format';
import { capital, numberWord } from '../../../lib/words';

/** When the next conference is and which of one's cases are on it. */
export function NextConference({ conference }: { conference: Today['nextConference'] }) {
  const format = useFormat();
  return (
    <aside className="next-conference" aria-labelledby="next-conference">
      <h2 id="next-conference">Next conference</h2>
      {conference === null ? (
        <p className="soft">No date is set on a case of yours.</p>
      ) : (
        <>
          <p className="soft">
            {format.longMoment(conference.at)}. {capital(numberWord(conference.cases.length))}{' '}
            {conference.cases.length === 1 ? 'case' : 'cases'} of yours.
          </p>
          <ul>
            {conference.cases.map((one) => (
              <li key={one.id}>
                <p className="row-title">
                  <Link className="figures" to={`/cases/${one.id}`}>
                    {one.number}
                  </Link>
                </p>
                <p className="soft small">{capital(one.detail)}</p>
              </li>
            ))}
          </ul>
        </>
      )}
    </aside>
  );
}
