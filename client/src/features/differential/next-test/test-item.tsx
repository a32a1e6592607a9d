import type { Finding } from '@weighhouse/shared/contracts/findings';
import { Link } from 'react-router-dom';
import { capital } from '../../../lib/words';
import type { Column } from '../model/columns';
import { burdenWords } from '../model/finding-words';
import { Results } from './results';
import { bitsWords, costWords, daysWords, idleWords, leaderWords, rankWords } from './test-words';
import { ChangeTestButton } from './change-test-button';
import { type TestView, unsaid } from './tests-view';

interface Props {
  test: TestView;
  of: number;
  columns: Column[];
  /** Where the panel stands now. */
  now: readonly number[];
  caseId: string;
  /** Null for whoever may not change findings. */
  onChange: ((finding: Finding) => void) | null;
}

/** One test: what it would settle, what it takes, and what each result would do. */
export function TestItem({ test, of, columns, now, caseId, onChange }: Props) {
  const { finding, rank, bits, frontier } = test;
  const idle = idleWords(test, now);
  return (
    <li className="test" id={`test-${String(rank)}`}>
      <h3 className="test-title">
        <span className="test-rank figures">{rank}</span>
        {finding.title}
      </h3>
      <p>
        <b>{capital(rankWords(test, of))}</b>: {bitsWords(bits)}. {leaderWords(test.leaderChanges)}
      </p>
      {idle !== null && <p className="test-idle">{idle}</p>}
      <p className="soft">
        Cost {costWords(finding.cost)}. Wait {daysWords(finding.waitDays)}. Burden{' '}
        {burdenWords(finding.burden)}.{frontier && of > 1 && ' No other test settles as much for as little.'}
      </p>
      <Unsaid finding={finding} />
      <details open={rank === 1}>
        <summary>What each result would do</summary>
        <Results test={test} columns={columns} now={now} />
        <p className="small soft">
          Out of 100 patients like this one. Black line: where the panel stands now.
        </p>
      </details>
      <p className="test-actions no-print">
        <ChangeTestButton finding={finding} onChange={onChange} />
        <Link to={`/cases/${caseId}/differential?finding=${finding.id}`}>Its row in the ledger</Link>
      </p>
    </li>
  );
}

function Unsaid({ finding }: { finding: Finding }) {
  const missing = unsaid(finding);
  if (missing.length === 0) return null;
  return (
    <p className="small soft">
      {capital(missing.join(', '))} {missing.length === 1 ? 'is' : 'are'} compared as if there were none,
      because nobody said.
    </p>
  );
}
