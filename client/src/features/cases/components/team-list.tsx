import { type Case, parts } from '@weighhouse/shared/contracts/cases';
import { capital } from '../../../lib/words';
import { partWords } from './case-words';

/** Who is on the case and in which part; weights only where they differ from 1. */
export function TeamList({ of }: { of: Case }) {
  const members = [...of.team].sort((a, b) => parts.indexOf(a.part) - parts.indexOf(b.part));
  if (members.length === 0) return null;
  return (
    <section aria-labelledby="team">
      <div className="section-head">
        <h2 id="team">Team</h2>
      </div>
      <ul className="team-list">
        {members.map((member) => (
          <li key={`${member.person.id} ${member.part}`}>
            {member.person.name}
            <p className="soft small">
              {capital(partWords[member.part])}. {member.person.specialty}, {member.person.centre}.
              {member.weight !== null && member.weight !== 1 && ` Weight ${String(member.weight)}.`}
              {member.weight !== null && member.weight !== 1 && member.reason !== null && ` ${member.reason}`}
            </p>
          </li>
        ))}
      </ul>
    </section>
  );
}
