import { naturalFrequency } from '@weighhouse/shared/reasoning/natural-frequency';
import type { Column } from '../model/columns';

const said = (share: number) => String(naturalFrequency(share).outOf100);

interface Moved {
  name: string;
  by: number;
  words: string;
  changed: boolean;
}

/**
 * What the standing would be without something, as a sentence: "Without the ferritin: Still's disease 48 instead of 61
 * of 100". It speaks of the leader, of a column that moves further, and of another leader.
 * @param without null where nobody is left whose numbers count
 */
export function withoutSentence(
  name: string,
  standing: readonly number[],
  without: readonly number[] | null,
  columns: readonly Column[],
): string {
  if (without === null) return `Without ${name} nobody is left whose numbers count.`;
  const leader = first(standing, columns);
  const next = first(without, columns);
  if (!leader || !next) return '';
  const moves = columns.map((column) => moved(column, standing, without));
  const ofLeader = moves[leader.index];
  const most = moves.reduce((one, other) => (other.by > one.by + 1e-9 ? other : one));
  if (!ofLeader || moves.every(({ changed }) => !changed))
    return `Without ${name}: nothing moves by as much as 1 of 100.`;
  const parts = [ofLeader.words];
  if (most !== ofLeader && most.changed) parts.push(most.words);
  const change = next.index === leader.index ? '' : ` ${nameOf(next)} would be first.`;
  return `Without ${name}: ${parts.join(', ')}.${change}`;
}

function moved(column: Column, standing: readonly number[], without: readonly number[]): Moved {
  const was = standing[column.index] ?? 0;
  const is = without[column.index] ?? 0;
  const changed = said(was) !== said(is);
  const name = nameOf(column);
  const words = changed
    ? `${name} ${said(is)} instead of ${naturalFrequency(was).words}`
    : `${name} stays at ${naturalFrequency(was).words}`;
  return { name, by: Math.abs(is - was), words, changed };
}

const nameOf = (column: Column) => column.short;

function first(standing: readonly number[], columns: readonly Column[]): Column | undefined {
  const most = Math.max(...standing);
  return columns.find((column) => (standing[column.index] ?? 0) >= most - 1e-12);
}
