import { z } from 'zod';
import type { Column } from '../model/columns';

/** How somebody laid out the columns of one case: by the ids of the candidates. */
export const columnChoiceSchema = z.object({ pinned: z.array(z.string()), folded: z.array(z.string()) });
export type ColumnChoice = Readonly<z.infer<typeof columnChoiceSchema>>;

export const plainChoice: ColumnChoice = { pinned: [], folded: [] };

/** From how small a share on "fold all" folds a column: below 2 of 100. */
export const foldBelow = 0.02;

const without = (ids: readonly string[], id: string) => ids.filter((one) => one !== id);

/** A pinned column stands beside the row titles, so it is not folded. */
export function pin(choice: ColumnChoice, id: string): ColumnChoice {
  return { pinned: [...without(choice.pinned, id), id], folded: without(choice.folded, id) };
}

export function unpin(choice: ColumnChoice, id: string): ColumnChoice {
  return { ...choice, pinned: without(choice.pinned, id) };
}

export function fold(choice: ColumnChoice, id: string): ColumnChoice {
  return { pinned: without(choice.pinned, id), folded: [...without(choice.folded, id), id] };
}

export function unfold(choice: ColumnChoice, id: string): ColumnChoice {
  return { ...choice, folded: without(choice.folded, id) };
}

/** The columns that "fold all" would fold: small, not pinned, not folded yet, and never none of these. */
export function smallColumns(
  columns: readonly Column[],
  standing: readonly number[] | null,
  { pinned, folded }: ColumnChoice,
): Column[] {
  if (!standing) return [];
  const kept = new Set([...pinned, ...folded]);
  return columns.filter(
    (column) => !column.none && !kept.has(column.id) && (standing[column.index] ?? 1) < foldBelow,
  );
}

export function foldAll(choice: ColumnChoice, columns: readonly Column[]): ColumnChoice {
  return columns.reduce((known, column) => fold(known, column.id), choice);
}
