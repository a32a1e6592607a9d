import type { AssessmentView } from '@weighhouse/shared/contracts/assessment';
import type { PanelView } from '@weighhouse/shared/contracts/differential';
import { useLedger } from '../ledger/ledger-context';
import { columnLabel } from '../model/columns';
import { isTwoLevel, reliabilityWord, stateWords } from '../model/finding-words';
import { cellInputs, exposures, pooledWords, priorInputs } from './sheet-inputs';
import { groupLetters, type SheetPerson } from './sheet-people';
import { whole } from './two-pools-table';

interface Props {
  panel: PanelView;
  assessment: AssessmentView;
  people: readonly SheetPerson[];
}

/** Every number that was given: in each cell the pool's in bold, then everybody's in the order of the people. */
export function SheetTable({ panel, assessment, people }: Props) {
  const { columns, rows } = useLedger();
  const contributors = people.map(({ contributor }) => contributor);
  const letters = groupLetters(panel);
  const inPanel = new Map(panel.findings.map((finding) => [finding.id, finding]));
  const shown = rows.filter(({ id }) => inPanel.has(id));
  return (
    <>
      <p>
        Of 100 patients with each, how many would show the finding: <b>the pool</b>, then numbers 1 to{' '}
        {people.length}; a dash is a blank. Exposure of 1 to {people.length}: o often, s sometimes, r seldom.
      </p>
      <table className="sheet-inputs">
        <thead>
          <tr>
            <th scope="col">Finding</th>
            <th scope="col">Exposure</th>
            {columns.map((column) => (
              <th key={column.id} scope="col">
                {columnLabel(column)}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          <tr>
            <th scope="row">Before any finding{assessment.priorGiven ? '' : ': nobody gave a prior'}</th>
            <td />
            {columns.map(({ id, index }) => (
              <td key={id} className="figures">
                <b>{whole(assessment.pooledPrior[index])}</b> {priorInputs(contributors, index)}
              </td>
            ))}
          </tr>
          {shown.map((finding) => {
            const group = inPanel.get(finding.id)?.group;
            return (
              <tr key={finding.id}>
                <th scope="row">
                  {finding.title}{' '}
                  <i>
                    {stateWords(finding)}
                    {!isTwoLevel(finding) && `, of ${finding.levelLabels.join('/')}`}
                    {finding.reliability < 0.995 && `, ${reliabilityWord(finding.reliability)}`}
                    {group !== undefined && `, ${letters.get(group) ?? ''}`}
                  </i>
                </th>
                <td className="figures">{exposures(contributors, finding.id)}</td>
                {columns.map(({ id, index }) => (
                  <td key={id} className="figures">
                    <b>{pooledWords(assessment, finding.id, index)}</b>{' '}
                    {cellInputs(contributors, finding.id, index)}
                  </td>
                ))}
              </tr>
            );
          })}
        </tbody>
      </table>
    </>
  );
}
