import { type PointerEvent, useRef } from 'react';

interface Props {
  /** Out of 100; null while nothing is set: then there is no mark that could suggest a number. */
  value: number | null;
  /** The others' numbers out of 100, where they may be seen. */
  others: readonly number[];
  onChange: (value: number) => void;
}

/**
 * A line from 0 to 100 on which a number can be set by dragging, in whole numbers from 1 to 99. It repeats the number
 * field beside it, where everything can be typed; so it is hidden from screen readers and not in the tab order.
 */
export function NumberTrack({ value, others, onChange }: Props) {
  const line = useRef<HTMLDivElement>(null);
  const set = (event: PointerEvent<HTMLDivElement>) => {
    const box = line.current?.getBoundingClientRect();
    if (!box || box.width === 0) return;
    const place = Math.round(((event.clientX - box.left) / box.width) * 100);
    onChange(Math.max(1, Math.min(99, place)));
  };
  return (
    <div
      ref={line}
      className="track"
      aria-hidden="true"
      data-unset={value === null || undefined}
      onPointerDown={(event) => {
        if (event.button !== 0) return;
        event.currentTarget.setPointerCapture(event.pointerId);
        set(event);
      }}
      onPointerMove={(event) => {
        if (event.currentTarget.hasPointerCapture(event.pointerId)) set(event);
      }}
    >
      <span className="track-line" />
      {value !== null && <span className="track-filled" style={{ width: `${String(value)}%` }} />}
      {others.map((other, index) => (
        <span key={index} className="track-tick" style={{ left: `${String(other)}%` }} />
      ))}
      {value !== null && (
        <span className="mark-diamond track-diamond" style={{ left: `${String(value)}%` }} />
      )}
    </div>
  );
}
