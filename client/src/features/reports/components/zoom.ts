/** Steps of zoom; 1 fits the width. */
export const zoomSteps = [0.5, 0.75, 1, 1.25, 1.5, 2, 3, 4] as const;

/** The next step in a direction; the last one stays. */
export function zoomed(zoom: number, direction: 1 | -1): number {
  const steps =
    direction === 1 ? zoomSteps.filter((step) => step > zoom) : zoomSteps.filter((step) => step < zoom);
  return (direction === 1 ? steps[0] : steps.at(-1)) ?? zoom;
}

/** The page that a key leads to; null for a key that turns no page. */
export function pageForKey(key: string, page: number, pages: number): number | null {
  switch (key) {
    case 'ArrowRight':
    case 'PageDown':
      return Math.min(pages, page + 1);
    case 'ArrowLeft':
    case 'PageUp':
      return Math.max(1, page - 1);
    case 'Home':
      return 1;
    case 'End':
      return pages;
    default:
      return null;
  }
}
