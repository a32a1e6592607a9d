import { BothTexts } from '../../../components/both-texts';
import type { FindingValues } from './finding-values';

interface Props {
  mine: FindingValues;
  theirs: FindingValues;
  onKeepMine: () => void;
  onTakeTheirs: () => void;
}

const names: Partial<Record<keyof FindingValues, string>> = {
  title: 'Finding',
  detail: 'Detail',
  kind: 'Kind',
  observed: 'State',
  reliability: 'Trust',
  observedOn: 'Date',
  page: 'Page',
  sourceText: 'Source',
  cost: 'Cost',
  waitDays: 'Wait',
  burden: 'Burden',
};

/** Two people changed the same finding: the fields in which the two differ. */
export function FindingBothTexts({ mine, theirs, ...choices }: Props) {
  const differing = (Object.keys(mine) as (keyof FindingValues)[]).filter(
    (key) => JSON.stringify(mine[key]) !== JSON.stringify(theirs[key]),
  );
  const list = (values: FindingValues) => (
    <ul className="both-lines">
      {differing.length === 0 && <li>The same.</li>}
      {differing.map((key) => (
        <li key={key}>
          {names[key] ?? key}: {String(values[key]) || 'empty'}
        </li>
      ))}
    </ul>
  );
  return <BothTexts what="this finding" mine={list(mine)} theirs={list(theirs)} {...choices} />;
}
