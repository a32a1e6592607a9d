import { Places } from './beam';
import { barPlace } from './beam-geometry';
import './marks.css';

interface ShareBarProps {
  /** 0 to 1; null draws no bar. */
  share: number | null;
  ticks: readonly number[];
  own: number | null;
  /** The column none of these is slate. */
  none?: boolean;
}

/** A share as a bar from zero, with the contributors' own shares on the same lane. */
export function ShareBar({ share, ticks, own, none = false }: ShareBarProps) {
  return (
    <span className="mark-lane" aria-hidden="true">
      {share !== null && (
        <span
          className="mark-beam"
          data-none={none || undefined}
          style={{ left: 0, width: `${String(barPlace(share))}%` }}
        />
      )}
      <Places ticks={ticks.map(barPlace)} own={own === null ? null : barPlace(own)} />
    </span>
  );
}
