import { beamPlace, beamShape } from './beam-geometry';
import './marks.css';

interface BeamProps {
  /** The pool's weight of evidence in decibans; null draws the lane with its marks but no beam. */
  decibans: number | null;
  /** The same by each other contributor. */
  ticks: readonly number[];
  /** By oneself. */
  own: number | null;
}

/**
 * What one finding adds for or against one candidate. The text beside it says the same to screen readers, so the
 * drawing is hidden from them.
 */
export function Beam({ decibans, ticks, own }: BeamProps) {
  const shape = decibans === null ? null : beamShape(decibans);
  return (
    <span className="mark-lane mark-lane--centred" aria-hidden="true">
      {shape && (
        <span
          className="mark-beam"
          data-side={shape.side}
          data-beyond={shape.beyond || undefined}
          style={{ left: `${String(shape.start)}%`, width: `${String(shape.width)}%` }}
        />
      )}
      <Places ticks={ticks.map(beamPlace)} own={own === null ? null : beamPlace(own)} />
    </span>
  );
}

/** Ticks and diamond on a horizontal lane, in percent of its width. */
export function Places({ ticks, own }: { ticks: readonly number[]; own: number | null }) {
  return (
    <>
      {ticks.map((place, index) => (
        <span key={index} className="mark-tick" style={{ left: `${String(place)}%` }} />
      ))}
      {own !== null && <span className="mark-diamond" style={{ left: `${String(own)}%` }} />}
    </>
  );
}
