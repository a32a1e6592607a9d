import type { Column } from '../model/columns';
import type { ColumnChoice } from './column-choice';

/** Pixels: the title column, what a column of figures needs at least, and a folded one. */
const titleWidth = 308;
const narrowTitleWidth = 280;
const leastTitleWidth = 200;
const goodColumnWidth = 92;
export const leastColumnWidth = 84;
export const foldedWidth = 24;

/** A column where it is drawn. */
export interface ShownColumn {
  column: Column;
  folded: boolean;
  pinned: boolean;
  /** The edge at which it stays while the rest is scrolled under it. */
  stuck: 'left' | 'right' | null;
  /** Pixels from that edge; the title column counts. */
  offset: number;
}

export interface Arrangement {
  shown: ShownColumn[];
  /** Pixels of the title column. */
  title: number;
  /** Pixels that the table needs at least. */
  least: number;
  /** The ledger is wider than its frame. */
  scrolls: boolean;
  /** Pixels at the left and at the right that stay while scrolling, with the titles. */
  stuckLeft: number;
  stuckRight: number;
}

/**
 * Puts the columns in the order in which they are drawn: pinned, open, folded, and *none of these* always last. Where
 * that is wider than the frame, *none of these* stays at the right edge and the pinned ones at the left, as many as
 * leave room for two columns to be scrolled between them.
 * @param width pixels of the frame; 0 before it is known
 */
export function arrange(columns: readonly Column[], choice: ColumnChoice, width: number): Arrangement {
  const pinned = (column: Column) => !column.none && choice.pinned.includes(column.id);
  const folded = (column: Column) => !column.none && !pinned(column) && choice.folded.includes(column.id);
  const open = columns.filter((column) => !column.none && !pinned(column) && !folded(column));
  const ordered = [
    ...columns.filter(pinned),
    ...open,
    ...columns.filter(folded),
    ...columns.filter((column) => column.none),
  ];
  const foldedCount = columns.filter(folded).length;
  const openCount = ordered.length - foldedCount;
  const title = titleFor(width, foldedCount * foldedWidth, openCount);
  const least = title + openCount * leastColumnWidth + foldedCount * foldedWidth;
  const scrolls = width > 0 && least > width;
  const room = scrolls ? Math.max(0, Math.floor((width - title) / leastColumnWidth) - 3) : 0;
  const shown = ordered.map((column, place): ShownColumn => {
    const isPinned = pinned(column);
    const left = scrolls && isPinned && place < room;
    const right = scrolls && column.none;
    return {
      column,
      folded: folded(column),
      pinned: isPinned,
      stuck: left ? 'left' : right ? 'right' : null,
      offset: left ? title + place * leastColumnWidth : 0,
    };
  });
  const stuck = shown.filter((one) => one.stuck === 'left').length;
  return {
    shown,
    title,
    least,
    scrolls,
    stuckLeft: title + stuck * leastColumnWidth,
    stuckRight: scrolls ? leastColumnWidth : 0,
  };
}

/** The titles give way to the figures where it is narrow. */
function titleFor(width: number, folded: number, columns: number): number {
  if (width < 800) return leastTitleWidth;
  return (width - titleWidth - folded) / columns < goodColumnWidth ? narrowTitleWidth : titleWidth;
}
