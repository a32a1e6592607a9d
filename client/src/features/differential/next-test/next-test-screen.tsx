import type { Differential } from '@weighhouse/shared/contracts/differential';
import type { Finding } from '@weighhouse/shared/contracts/findings';
import { useMemo, useState } from 'react';
import { Caution } from '../../../components/caution';
import { columnsOf } from '../model/columns';
import { ChangeTestDialog } from './change-test-dialog';
import { NothingToRank } from './nothing-to-rank';
import { Scatter } from './scatter';
import { HowRanked } from './how-ranked';
import { TestItem } from './test-item';
import { headline } from './test-words';
import { TestsTable } from './tests-table';
import { pendingOf, testsOf, unjudgedTests } from './tests-view';
import { UnjudgedTests } from './unjudged-tests';
import '../editor/editor.css';
import './next-test.css';

/** The pending findings ranked by what they would settle, what they take, and what each result would do. */
export function NextTestScreen({ differential }: { differential: Differential }) {
  const columns = useMemo(() => columnsOf(differential.candidates), [differential.candidates]);
  const tests = useMemo(() => testsOf(differential), [differential]);
  const unjudged = useMemo(() => unjudgedTests(differential), [differential]);
  const [changing, setChanging] = useState<Finding | null>(null);
  const { abilities, assessment } = differential;
  const change = abilities.includes('finding.change') ? setChanging : null;
  const pending = pendingOf(differential.findings);
  return (
    <section className="next-test" aria-labelledby="next-test-title">
      {tests.length === 0 || !assessment ? (
        <NothingToRank differential={differential} pending={pending.length} />
      ) : (
        <>
          <header className="next-test-head">
            <h2 id="next-test-title">{headline(tests)}</h2>
            <p className="soft">{basis(differential)}</p>
          </header>
          <div className="next-test-work">
            <ol className="tests">
              {tests.map((test) => (
                <TestItem
                  key={test.finding.id}
                  test={test}
                  of={tests.length}
                  columns={columns}
                  now={assessment.standing}
                  caseId={differential.caseId}
                  onChange={change}
                />
              ))}
            </ol>
            <aside className="next-test-side" aria-label="What it settles against what it takes">
              <Scatter tests={tests} />
              <HowRanked />
            </aside>
          </div>
          <TestsTable tests={tests} />
        </>
      )}
      {unjudged.length > 0 && (
        <UnjudgedTests differential={differential} findings={unjudged} onChange={change} />
      )}
      <Caution />
      <ChangeTestDialog
        differential={differential}
        finding={changing}
        onClose={() => {
          setChanging(null);
        }}
      />
    </section>
  );
}

/** Whose numbers the ranking rests on, and how they are read. */
function basis({ assessment, settings, sealed, shownRound, round }: Differential): string {
  const people = Object.keys(assessment?.own ?? {}).length;
  const parts = [
    `Worked out from the pooled judgements of ${String(people)} ${people === 1 ? 'contributor' : 'contributors'}`,
  ];
  if (settings.coexistence > 0) parts.push('read so that several candidates may coexist');
  const sentence = `${parts.join(', ')}.`;
  return sealed && shownRound
    ? `${sentence} As round ${String(shownRound.number)} left it: round ${String(round?.number ?? 0)} is sealed, and nothing of it is used here.`
    : sentence;
}
