import { paragraphsOf } from '../model/summary-words';

/** The text as the patient hears or reads it. */
export function SummaryText({ body }: { body: string }) {
  const paragraphs = paragraphsOf(body);
  if (paragraphs.length === 0) return <p className="soft">Nothing is written yet.</p>;
  return (
    <div className="summary-text">
      {paragraphs.map((paragraph, place) => (
        <p key={`${String(place)} ${paragraph}`}>{paragraph}</p>
      ))}
    </div>
  );
}
