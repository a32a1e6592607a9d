import type { Plan } from '@weighhouse/shared/contracts/plans';
import { useFormat } from '../../../lib/use-format';

/** What each contributor said to the plan, dissent with its words. */
export function StanceList({ stances }: { stances: Plan['stances'] }) {
  const format = useFormat();
  return (
    <ul className="stance-list">
      {stances.map(({ person, stance, words, at, changedSince }) => (
        <li key={person.id}>
          <span className="stance-who">
            {person.name}
            {person.specialty !== '' && <span className="soft small"> {person.specialty}</span>}
          </span>
          <span className={stance === null ? 'soft' : undefined}>
            {stance === null ? 'Not answered' : stance === 'agree' ? 'Agrees' : 'Dissents'}
            {at !== null && <span className="soft small"> {format.moment(at)}</span>}
          </span>
          {changedSince === true && (
            <span className="late small stance-note">The plan was changed after this was said.</span>
          )}
          {words !== null && words !== '' && <p className="note plan-words">{words}</p>}
        </li>
      ))}
    </ul>
  );
}
