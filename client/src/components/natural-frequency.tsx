import { naturalFrequency } from '@weighhouse/shared/reasoning/natural-frequency';

/** A share from 0 to 1 as people read it: "17 of 100", "under 1 of 100". */
export function NaturalFrequency({ share, like = false }: { share: number; like?: boolean }) {
  return (
    <span className="figures">
      {naturalFrequency(share).words}
      {like ? ' like this' : ''}
    </span>
  );
}
