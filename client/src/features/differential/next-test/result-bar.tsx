import { barPlace } from '../../../components/marks/beam-geometry';
import '../../../components/marks/marks.css';

interface Props {
  /** Where the panel would stand, 0 to 1. */
  share: number;
  /** Where it stands now. */
  now: number | null;
  none: boolean;
}

/** A share from zero with a black line where the panel stands now; the figure beside it says the number. */
export function ResultBar({ share, now, none }: Props) {
  return (
    <span className="mark-lane result-bar" aria-hidden="true">
      <span
        className="mark-beam"
        data-none={none || undefined}
        style={{ left: 0, width: `${String(barPlace(share))}%` }}
      />
      {now !== null && <span className="result-now" style={{ left: `${String(barPlace(now))}%` }} />}
    </span>
  );
}
