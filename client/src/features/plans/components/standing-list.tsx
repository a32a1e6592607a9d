import { naturalFrequency } from '@weighhouse/shared/reasoning/natural-frequency';
import { HundredMarks } from '../../../components/marks/hundred-marks';
import './standing-list.css';

export interface Standing {
  name: string;
  /** 0 to 1. */
  share: number;
  /** The column none of these is slate. */
  none: boolean;
}

/** Where the panel stands: a name, a bar from zero and its natural frequency for each candidate. */
export function StandingList({ standing, label }: { standing: readonly Standing[]; label: string }) {
  return (
    <>
      <ul className="standing-list" aria-label={label}>
        {standing.map(({ name, share, none }) => {
          const { words, percent } = naturalFrequency(share);
          return (
            <li key={name}>
              <span className="standing-name">{name}</span>
              <span className="standing-lane" aria-hidden="true">
                <span data-none={none || undefined} style={{ width: `${String(share * 100)}%` }} />
              </span>
              <span className="standing-figures figures">
                <b>{percent}</b> <span className="soft">{words} like this</span>
              </span>
            </li>
          );
        })}
      </ul>
      <LeadingPicture standing={standing} />
    </>
  );
}

/** The largest share as a picture of a hundred patients. */
function LeadingPicture({ standing }: { standing: readonly Standing[] }) {
  const [leading] = standing.toSorted((one, other) => other.share - one.share);
  if (!leading) return null;
  const { outOf100, words } = naturalFrequency(leading.share);
  return (
    <figure className="standing-picture">
      <HundredMarks outOf100={outOf100} label={`${words}: ${leading.name}`} none={leading.none} />
      <figcaption className="small soft">
        Of 100 patients like this, <b className="figures">{words}</b>: {leading.name}
      </figcaption>
    </figure>
  );
}
