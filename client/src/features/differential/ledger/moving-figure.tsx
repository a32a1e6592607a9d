import { naturalFrequency } from '@weighhouse/shared/reasoning/natural-frequency';
import { useEffect, useRef, useState } from 'react';

/** Milliseconds in which a number moves, as the marks do. */
const moveFor = 200;

const still = () => matchMedia('(prefers-reduced-motion: reduce)').matches;

/** A share that follows its target in 200 ms; at once under reduced motion or where there was no number before. */
function useMoving(target: number): number {
  const [shown, setShown] = useState(target);
  const from = useRef(target);
  useEffect(() => {
    const start = from.current;
    if (start === target) return;
    if (still()) {
      from.current = target;
      setShown(target);
      return;
    }
    const began = performance.now();
    let frame = requestAnimationFrame(function step(now) {
      const way = Math.max(0, Math.min(1, (now - began) / moveFor));
      from.current = start + (target - start) * way;
      setShown(from.current);
      if (way < 1) frame = requestAnimationFrame(step);
    });
    return () => {
      cancelAnimationFrame(frame);
    };
  }, [target]);
  return shown;
}

/** A share as a whole number out of 100, or in percent, that moves when the pool moves. */
export function MovingFigure({ share, percent = false }: { share: number; percent?: boolean }) {
  const shown = naturalFrequency(useMoving(share));
  return <>{percent ? shown.percent : shown.outOf100}</>;
}
