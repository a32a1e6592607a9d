import type { Identity } from '@weighhouse/shared/contracts/summaries';
import { useFormat } from '../../../lib/use-format';

type Card = NonNullable<Identity['card']>;

/** The card to read. */
export function IdentityCard({ card }: { card: Card }) {
  const format = useFormat();
  return (
    <dl className="identity-card">
      <dt>Name</dt>
      <dd>{card.name}</dd>
      <dt>Born</dt>
      <dd>{format.date(card.birthDate)}</dd>
      <dt>Telephone</dt>
      <dd>
        {card.telephone === '' ? (
          <span className="soft">Not known</span>
        ) : (
          <a className="figures" href={`tel:${card.telephone.replaceAll(/[^+\d]/g, '')}`}>
            {card.telephone}
          </a>
        )}
      </dd>
      <dt>Language</dt>
      <dd>{card.language === '' ? <span className="soft">Not known</span> : card.language}</dd>
      <dt>How to be reached</dt>
      <dd className="contact-words">
        {card.howToReach === '' ? <span className="soft">Not said</span> : card.howToReach}
      </dd>
    </dl>
  );
}
