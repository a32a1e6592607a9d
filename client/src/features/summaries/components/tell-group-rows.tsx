import { Button } from '@radix-ui/themes';
import type { TellList } from '@weighhouse/shared/contracts/summaries';
import { useId } from 'react';
import { Link } from 'react-router-dom';
import { useFormat } from '../../../lib/use-format';
import { attemptsWords, groupOf, type TellGroup } from '../model/summary-words';

type Item = TellList['items'][number];

const verbs: Record<TellGroup, string> = {
  ready: 'Tell',
  write: 'Write',
  chair: 'Open',
  later: 'Open',
  told: 'Open',
};

interface Props {
  title: string;
  note: string;
  items: readonly Item[];
  ready: boolean;
}

/** The cases of one group, oldest first; nothing of a case but its number. */
export function TellGroupRows({ title, note, items, ready }: Props) {
  const format = useFormat();
  const id = useId();
  if (items.length === 0) return null;
  const oldestFirst = items.toSorted((one, other) => Date.parse(one.since) - Date.parse(other.since));
  return (
    <section aria-labelledby={id}>
      <div className="section-head">
        <h2 id={id}>{title}</h2>
        <span className="soft small">{note}</span>
      </div>
      <ul className="tell-rows">
        {oldestFirst.map((item) => (
          <li key={item.caseId}>
            <span className="figures">{item.number}</span>
            <span className="soft">
              Since {format.day(item.since)}. {attemptsWords(item.attempts)}.
            </span>
            <Button asChild variant={ready ? 'solid' : 'outline'}>
              <Link to={`/tell/${item.caseId}`}>
                {verbs[groupOf(item)]}
                <span className="aside-text"> {item.number}</span>
              </Link>
            </Button>
          </li>
        ))}
      </ul>
    </section>
  );
}
