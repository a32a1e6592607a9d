import { createColumnHelper, tableFeatures } from '@tanstack/react-table';
import type { CaseListItem } from '@weighhouse/shared/contracts/cases';
import { Link } from 'react-router-dom';
import { LeaderBar } from '../../../components/leader-bar';
import { SealedMark } from '../../../components/sealed-mark';
import { useFormat } from '../../../lib/use-format';
import { patientWords, stateLine, urgencyWords } from './case-words';

export const features = tableFeatures({});
const helper = createColumnHelper<typeof features, CaseListItem>();

/** Columns that the server can sort by, and under which name. */
export const sortNames: Readonly<Record<string, string>> = {
  number: 'number',
  question: 'question',
  state: 'state',
  urgency: 'urgency',
  conference: 'conferenceAt',
  changed: 'updatedAt',
};

export const columns = helper.columns([
  helper.accessor('number', {
    id: 'number',
    header: 'Number',
    cell: ({ row }) => <span className="figures">{row.original.number}</span>,
  }),
  helper.accessor('question', {
    id: 'question',
    header: 'Question',
    cell: ({ row }) => <Question of={row.original} />,
  }),
  helper.accessor('state', { id: 'state', header: 'State', cell: ({ row }) => stateLine(row.original) }),
  helper.accessor('leader', {
    id: 'leader',
    header: 'Leader',
    cell: ({ row }) => <Leader of={row.original} />,
  }),
  helper.accessor('disagreementBits', {
    id: 'disagreement',
    header: 'Disagreement',
    cell: ({ row }) => <Disagreement bits={row.original.disagreementBits} />,
  }),
  helper.accessor('urgency', {
    id: 'urgency',
    header: 'Urgency',
    cell: ({ row }) => (row.original.urgency === null ? '' : urgencyWords[row.original.urgency]),
  }),
  helper.accessor('conferenceAt', {
    id: 'conference',
    header: 'Conference',
    cell: ({ row }) => <Moment at={row.original.conferenceAt} otherwise="not yet" />,
  }),
  helper.accessor('updatedAt', {
    id: 'changed',
    header: 'Changed',
    cell: ({ row }) => <Moment at={row.original.updatedAt} otherwise="" />,
  }),
]);

function Question({ of }: { of: CaseListItem }) {
  const to = of.state === 'draft' ? `/cases/${of.id}/edit` : `/cases/${of.id}`;
  return (
    <>
      <Link className="row-title" to={to}>
        {of.question === '' ? 'A question not written yet' : of.question}
      </Link>
      <span className="case-row-note">
        {patientWords(of)}. From {of.referrerName}.
      </span>
    </>
  );
}

function Leader({ of: { leader } }: { of: CaseListItem }) {
  return (
    <>
      {leader !== null && leader !== 'sealed' && <span className="leader-name">{leader.name}</span>}
      <LeaderBar leader={leader} sealedWords="sealed" quiet />
    </>
  );
}

function Disagreement({ bits }: { bits: CaseListItem['disagreementBits'] }) {
  if (bits === 'sealed') return <SealedMark />;
  return bits === null ? null : <span className="figures">{bits.toFixed(2)} bit</span>;
}

function Moment({ at, otherwise }: { at: string | null; otherwise: string }) {
  const format = useFormat();
  return <span className={at === null ? 'soft' : ''}>{at === null ? otherwise : format.weekday(at)}</span>;
}
