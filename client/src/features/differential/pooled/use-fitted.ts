import { type RefObject, useLayoutEffect } from 'react';

/** Pixels of an A4 page on its side inside its margins: 190 of 210 millimetres. */
const pageHeight = (190 * 96) / 25.4;
/** Smaller than this nobody reads it; what does not fit then goes on to a second page. */
const smallest = 0.62;

/** Shrinks a sheet, a little at a time, until it fits on one page. */
export function useFitted(sheet: RefObject<HTMLElement | null>, ready: boolean): void {
  useLayoutEffect(() => {
    if (ready && sheet.current) fit(sheet.current);
  }, [sheet, ready]);
}

/** The stylesheet makes the sheet as much wider as it is drawn smaller, so that it keeps the page's width. */
function fit(element: HTMLElement): void {
  for (let zoom = 1; zoom >= smallest; zoom -= 0.02) {
    element.style.setProperty('--sheet-zoom', zoom.toFixed(2));
    if (element.scrollHeight * zoom <= pageHeight) return;
  }
}
