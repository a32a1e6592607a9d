import { Button } from '@radix-ui/themes';
import type { TodayItem } from '@weighhouse/shared/contracts/today';
import { Link } from 'react-router-dom';
import { SealedMark } from '../../../components/sealed-mark';
import { useFormat } from '../../../lib/use-format';
import { capital, counted } from '../../../lib/words';
import { dueLine } from './today-words';

/** One thing that waits: the case's number, what it is, how much or by when, and the button that does it. */
export function WaitingRow({ item, verb }: { item: TodayItem; verb: string }) {
  return (
    <li className="today-row">
      <span className="figures today-number">{item.number}</span>
      <div>
        <p className="row-title">{item.title}</p>
        <p className="soft small">{capital(item.detail)}</p>
      </div>
      <Mark item={item} />
      <Button
        asChild
        variant={item.kind === 'judge' ? 'solid' : 'outline'}
        color={item.kind === 'judge' ? undefined : 'gray'}
        highContrast={item.kind !== 'judge'}
      >
        <Link to={item.path} aria-label={`${verb}: ${item.number} ${item.title}`}>
          {verb}
        </Link>
      </Button>
    </li>
  );
}

function Mark({ item }: { item: TodayItem }) {
  const format = useFormat();
  if (item.sealedRows !== null)
    return <SealedMark>{`sealed: ${counted(item.sealedRows, 'row')} to judge`}</SealedMark>;
  if (item.dueOn === null) return <span className="today-blank" />;
  // A due day may come as a calendar day or as a moment.
  const day = item.dueOn.length === 10 ? item.dueOn : format.toField(item.dueOn).slice(0, 10);
  return (
    <span className={item.late ? 'late' : 'soft'}>
      {dueLine(day, format.today(), format.day(`${day}T12:00:00Z`))}
    </span>
  );
}
