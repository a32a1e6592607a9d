import { type CaseQuery, caseQuerySchema } from '@weighhouse/shared/contracts/cases';

/** What the address bar asks for; whatever in it cannot be understood counts as not asked. */
export function queryOf(search: URLSearchParams): CaseQuery {
  const asked: Record<string, string> = {};
  for (const key of ['state', 'q', 'sort', 'page', 'size']) {
    const value = search.get(key);
    if (value !== null && value !== '' && caseQuerySchema.safeParse({ [key]: value }).success)
      asked[key] = value;
  }
  return caseQuerySchema.parse(asked);
}

const standard = caseQuerySchema.parse({});

/** The query as an address, without what is standard anyway. */
export function searchOf(query: CaseQuery): URLSearchParams {
  const search = new URLSearchParams();
  for (const key of ['state', 'q', 'sort', 'page', 'size'] as const) {
    const value = query[key];
    if (value !== undefined && value !== '' && value !== standard[key]) search.set(key, String(value));
  }
  return search;
}

/** The next sort after a click on a column: ascending, then descending. */
export function nextSort(sort: string, column: string): string {
  return sort === column ? `-${column}` : column;
}

export function sortDirection(sort: string, column: string): 'ascending' | 'descending' | undefined {
  if (sort === column) return 'ascending';
  return sort === `-${column}` ? 'descending' : undefined;
}
