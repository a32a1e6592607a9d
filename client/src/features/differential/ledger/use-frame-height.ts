import { type RefObject, useEffect } from 'react';

/**
 * Where the ledger scrolls inside its own frame, the frame always ends at the lower edge of the window, so that the
 * standing row at its bottom stays in view: it grows while the page is scrolled towards it.
 */
export function useFrameHeight(frame: RefObject<HTMLElement | null>, scrolls: boolean): void {
  useEffect(() => {
    const element = frame.current;
    if (!element || !scrolls) return;
    const fit = () => {
      const top = Math.max(0, element.getBoundingClientRect().top);
      element.style.setProperty('--frame-height', `${String(Math.max(360, window.innerHeight - top))}px`);
    };
    fit();
    window.addEventListener('scroll', fit, { passive: true });
    window.addEventListener('resize', fit);
    return () => {
      window.removeEventListener('scroll', fit);
      window.removeEventListener('resize', fit);
    };
  }, [frame, scrolls]);
}
