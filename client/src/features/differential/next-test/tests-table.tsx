import { naturalFrequency } from '@weighhouse/shared/reasoning/natural-frequency';
import { burdenWords } from '../model/finding-words';
import { bitsWords, costWords, daysWords, rankWords } from './test-words';
import type { TestView } from './tests-view';

/** The drawing and the list once more as one table. */
export function TestsTable({ tests }: { tests: readonly TestView[] }) {
  return (
    <section className="tests-table-section">
      <h3 id="tests-table-title">All tests side by side</h3>
      <div className="tests-table-frame" role="region" aria-labelledby="tests-table-title" tabIndex={0}>
        <table className="tests-table">
          <thead>
            <tr>
              <th scope="col">Test</th>
              <th scope="col">It</th>
              <th scope="col" className="tests-number">
                Bits
              </th>
              <th scope="col" className="tests-number">
                Cost
              </th>
              <th scope="col" className="tests-number">
                Wait
              </th>
              <th scope="col">Burden</th>
              <th scope="col" className="tests-number">
                First place changes
              </th>
              <th scope="col">Best for what it takes</th>
            </tr>
          </thead>
          <tbody>
            {tests.map((test) => (
              <tr key={test.finding.id}>
                <th scope="row">
                  <span className="figures">{test.rank}</span> {test.finding.title}
                </th>
                <td>{rankWords(test, tests.length)}</td>
                <td className="tests-number figures">{bitsWords(test.bits).replace(' bits', '')}</td>
                <td className="tests-number figures">{costWords(test.finding.cost)}</td>
                <td className="tests-number figures">{daysWords(test.finding.waitDays)}</td>
                <td>{burdenWords(test.finding.burden)}</td>
                <td className="tests-number figures">
                  {test.leaderChanges === 0 ? 'never' : naturalFrequency(test.leaderChanges).words}
                </td>
                <td>{test.frontier ? 'yes' : 'no'}</td>
              </tr>
            ))}
          </tbody>
        </table>
      </div>
    </section>
  );
}
