import { useEffect, useRef, useState } from 'react';

/** The width in pixels of the element that the ref is put on; 0 before it is drawn. */
export function useWidth<T extends HTMLElement>() {
  const element = useRef<T>(null);
  const [width, setWidth] = useState(0);
  useEffect(() => {
    if (!element.current) return;
    const observer = new ResizeObserver(([entry]) => {
      if (entry) setWidth(entry.contentRect.width);
    });
    observer.observe(element.current);
    return () => {
      observer.disconnect();
    };
  }, []);
  return [element, width] as const;
}
