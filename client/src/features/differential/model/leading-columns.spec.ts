import { expect, it } from 'vitest';
import { makeCandidate } from '../testing/make-differential';
import { columnsOf } from './columns';
import { leadingColumns } from './leading-columns';

const columns = columnsOf(['a', 'b', 'c', 'd'].map((id) => makeCandidate(id)));
const ids = (standing: number[] | null) => leadingColumns(columns, standing, 3).map((column) => column.id);

it('takes the largest shares and keeps the order of the ledger', () => {
  expect(ids([0.1, 0.4, 0.05, 0.25, 0.2])).toEqual(['b', 'd', 'none']);
});

it('takes the first columns where nothing stands yet, and of a tie the first', () => {
  expect(ids(null)).toEqual(['a', 'b', 'c']);
  expect(ids([0.2, 0.2, 0.2, 0.2, 0.2])).toEqual(['a', 'b', 'c']);
});
