import '../components/today.css';
import { Button } from '@radix-ui/themes';
import type { Today } from '@weighhouse/shared/contracts/today';
import { Link } from 'react-router-dom';
import { EmptyState } from '../../../components/empty-state';
import { Failure } from '../../../components/failure';
import { PageTitle } from '../../../components/page-title';
import { SkeletonPage } from '../../../components/skeleton';
import { useSignedIn } from '../../people/api/get-me';
import { useToday } from '../api/get-today';
import { NextConference } from '../components/next-conference';
import { Sitting } from '../components/sitting';
import { oldestLine, sections, todayTitle } from '../components/today-words';
import { WaitingRow } from '../components/waiting-row';

export default function TodayPage() {
  const found = useToday();
  if (found.data) return <TodayView today={found.data} />;
  if (found.isPending) return <SkeletonPage />;
  return (
    <div className="page">
      <Failure
        error={found.error}
        what="What waits for you could not be loaded."
        retry={() => void found.refetch()}
      />
    </div>
  );
}

function TodayView({ today }: { today: Today }) {
  const { waiting } = today;
  const { roles } = useSignedIn();
  const refers = roles.includes('referrer');
  const clinical = refers || roles.includes('specialist') || roles.includes('chair');
  return (
    <div className="today">
      <div className="page">
        <PageTitle
          note={oldestLine(waiting, today.now) ?? undefined}
          actions={
            refers && (
              <Button asChild variant="outline">
                <Link to="/cases/new">New referral</Link>
              </Button>
            )
          }
        >
          {todayTitle(waiting.length)}
        </PageTitle>
        {waiting.length === 0 && (
          <EmptyState title="You are up to date.">
            {clinical
              ? 'As soon as a case needs your judgement, an answer or a signature, it stands here.'
              : roles.includes('liaison')
                ? 'As soon as a summary is ready to be written or told, its case stands here by its number.'
                : 'Invitations and people are looked after under People.'}
          </EmptyState>
        )}
        {sections.map(({ id, head, verb, takes }) => {
          const items = waiting.filter(takes);
          if (items.length === 0) return null;
          return (
            <section key={id} aria-labelledby={`today-${id}`}>
              <div className="section-head">
                <h2 id={`today-${id}`}>{head}</h2>
                {items.some((item) => item.sealedRows !== null) && (
                  <span className="soft small">sealed until the chair unseals the round</span>
                )}
              </div>
              <ul className="today-list">
                {items.map((item) => (
                  <WaitingRow key={`${item.caseId} ${item.path} ${item.title}`} item={item} verb={verb} />
                ))}
              </ul>
            </section>
          );
        })}
        <Sitting today={today} />
      </div>
      {clinical && <NextConference conference={today.nextConference} />}
    </div>
  );
}
