import { type FocusEvent, type KeyboardEvent, type MouseEvent, useCallback, useEffect, useRef } from 'react';
import { type GridSize, held, moveInGrid, type Place, startsNumber } from './movement';

export interface GridActions {
  open: (place: Place) => void;
  /** A digit is typed on a cell; whatever has the focus afterwards receives it. */
  type: (place: Place) => void;
  why: (place: Place) => void;
  /** What can be done with the cell's column. */
  menu: (place: Place) => void;
  escape: () => void;
  keys: () => void;
}

const placeOf = (element: Element | null): Place | null => {
  const cell = element?.closest<HTMLElement>('[data-row][data-column]');
  return cell ? { row: Number(cell.dataset.row), column: Number(cell.dataset.column) } : null;
};

const cellAt = (table: HTMLElement | null, { row, column }: Place) =>
  table?.querySelector<HTMLElement>(`[data-row="${String(row)}"][data-column="${String(column)}"]`) ?? null;

/**
 * Keyboard and mouse on the ledger's grid. One cell is in the tab order at a time; which one is kept in the page, not
 * in React's state, so that moving through a thousand cells draws nothing anew.
 */
export function useGrid(size: GridSize, actions: GridActions) {
  const table = useRef<HTMLTableElement>(null);
  const current = useRef<Place>({ row: 0, column: 0 });

  const enter = useCallback((place: Place) => {
    cellAt(table.current, current.current)?.setAttribute('tabindex', '-1');
    current.current = place;
    cellAt(table.current, place)?.setAttribute('tabindex', '0');
  }, []);

  useEffect(() => {
    enter(held(current.current, size));
  });

  const focusPlace = useCallback((place: Place) => {
    cellAt(table.current, place)?.focus();
  }, []);

  const onKeyDown = (event: KeyboardEvent<HTMLTableElement>) => {
    if (event.altKey || event.metaKey || !(event.target instanceof HTMLElement)) return;
    const place = placeOf(event.target);
    // Buttons inside a cell keep their own keys.
    if (!place || event.target.closest('button, a, input')) return;
    if (handle(event, place)) event.preventDefault();
  };

  const handle = (event: KeyboardEvent, place: Place): boolean => {
    const to = moveInGrid(place, event.key, event.ctrlKey, size);
    if (to) {
      focusPlace(to);
      return true;
    }
    if (event.ctrlKey) return false;
    if (startsNumber(event.key)) {
      actions.type(place);
      return false;
    }
    const act = actionOf(event.key);
    if (act === null) return false;
    act(place);
    return true;
  };

  const actionOf = (key: string): ((place: Place) => void) | null => {
    if (key === 'Enter' || key === ' ') return actions.open;
    if (key === 'w') return actions.why;
    if (key === 'm') return actions.menu;
    if (key === 'Escape') return actions.escape;
    return key === '?' ? actions.keys : null;
  };

  const onClick = (event: MouseEvent<HTMLTableElement>) => {
    if (!(event.target instanceof Element) || event.target.closest('button, a, input')) return;
    const place = placeOf(event.target);
    if (place) actions.open(place);
  };

  const onFocus = (event: FocusEvent<HTMLTableElement>) => {
    const place = placeOf(event.target);
    if (place) enter(place);
  };

  return { table, focusPlace, current, tableProps: { ref: table, onKeyDown, onClick, onFocus } };
}
