import { barPlace } from './beam-geometry';
import './marks.css';

interface StandingPostProps {
  /** 0 to 1; null where the pool is sealed or not there yet. */
  share: number | null;
  range: { low: number; high: number } | null;
  /** Where it stood before this round. */
  before: number | null;
  /** Where each other contributor stands alone. */
  ticks: readonly number[];
  /** Where oneself stands alone. */
  own: number | null;
  /** Where it would stand without what somebody points at. */
  without?: number | null;
  none: boolean;
  sealed: boolean;
}

const at = (share: number) => ({ bottom: `${String(barPlace(share))}%` });

/** Where the panel stands on one candidate, drawn upright; the text below it says the same in words. */
export function StandingPost({
  share,
  range,
  before,
  ticks,
  own,
  without = null,
  none,
  sealed,
}: StandingPostProps) {
  return (
    <span className="mark-post" data-sealed={sealed || undefined} aria-hidden="true">
      {sealed && <span className="mark-post-word">sealed</span>}
      {share !== null && (
        <span
          className="mark-post-bar"
          data-none={none || undefined}
          style={{ height: `${String(barPlace(share))}%` }}
        />
      )}
      {before !== null && <span className="mark-before" style={at(before)} />}
      {without !== null && <span className="mark-without" style={at(without)} />}
      {range && (
        <span
          className="mark-range"
          style={{ ...at(range.low), height: `${String(barPlace(range.high) - barPlace(range.low))}%` }}
        />
      )}
      {ticks.map((tick, index) => (
        <span key={index} className="mark-post-tick" style={at(tick)} />
      ))}
      {own !== null && <span className="mark-diamond mark-diamond--post" style={at(own)} />}
    </span>
  );
}
