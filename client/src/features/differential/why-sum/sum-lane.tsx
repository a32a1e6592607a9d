import type { CSSProperties } from 'react';
import './why-sum.css';

interface Props {
  /** Decibans: to the right it counts for, to the left against. */
  decibans: number;
  /** Decibans from the centre line to each end of the lane. */
  reach: number;
  /** The sum up to here, as the black line that wanders down the rows. */
  soFar: number;
  kind: 'start' | 'push' | 'end';
}

/** One line of the sum as a beam from the centre line. The figures beside it say the same, so it is hidden from readers. */
export function SumLane({ decibans, reach, soFar, kind }: Props) {
  const place = (value: number) => 50 + (Math.max(-reach, Math.min(reach, value)) / reach) * 50;
  const end = place(decibans);
  const style: CSSProperties = {
    left: `${String(Math.min(50, end))}%`,
    width: `${String(Math.abs(end - 50))}%`,
  };
  return (
    <span className="mark-lane mark-lane--centred sum-lane" aria-hidden="true">
      <span
        className="mark-beam sum-beam"
        data-kind={kind}
        data-side={decibans < 0 ? 'against' : 'for'}
        style={style}
      />
      <span className="sum-so-far" style={{ left: `${String(place(soFar))}%` }} />
    </span>
  );
}
