import type { Differential } from '@weighhouse/shared/contracts/differential';
import type { Finding } from '@weighhouse/shared/contracts/findings';
import { Link } from 'react-router-dom';
import { counted, listed } from '../../../lib/words';
import { mayJudge } from '../ledger/ledger-context';
import { effortWords } from '../model/finding-words';
import { ChangeTestButton } from './change-test-button';
import { unsaid } from './tests-view';

interface Props {
  differential: Differential;
  findings: readonly Finding[];
  onChange: ((finding: Finding) => void) | null;
}

/** Findings that are not known yet and cannot be ranked: what is missing, and the way to give it. */
export function UnjudgedTests({ differential, findings, onChange }: Props) {
  const { assessment, caseId, mine } = differential;
  const judge = mayJudge(differential);
  const ownRows = new Set(
    mine?.findings.filter((row) => row.outOf100.some((cell) => cell !== null)).map((row) => row.findingId),
  );
  return (
    <section className="unjudged" aria-labelledby="unjudged-title">
      <h3 id="unjudged-title">
        {assessment
          ? `${counted(findings.length, 'test waits', 'tests wait')} for a judgement`
          : `${counted(findings.length, 'finding is', 'findings are')} not known yet`}
      </h3>
      <ul>
        {findings.map((finding) => {
          const own = ownRows.has(finding.id);
          const missing = unsaid(finding);
          return (
            <li key={finding.id}>
              <span>
                <b>{finding.title}</b>
                <span className="small soft unjudged-line">
                  {assessment &&
                    'Nobody whose judgement counts has said how often each result would be seen. '}
                  {!assessment && judge && (own ? 'You have judged it. ' : 'You have not judged it. ')}
                  {effortWords(finding).length > 0 && `To find out: ${effortWords(finding).join(', ')}. `}
                  {missing.length > 0 && `Not said: ${listed(missing)}.`}
                </span>
              </span>
              <span className="test-actions no-print">
                <ChangeTestButton finding={finding} onChange={onChange} />
                <Link to={`/cases/${caseId}/differential?finding=${finding.id}`}>
                  {judge ? 'Judge it' : 'Its row in the ledger'}
                </Link>
              </span>
            </li>
          );
        })}
      </ul>
    </section>
  );
}
