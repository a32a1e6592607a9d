import { HundredMarks } from '../../../components/marks/hundred-marks';
import { numberTold } from '../model/number-told';
import { paragraphsOf } from '../model/summary-words';

/** The text as the patient hears or reads it. */
export function SummaryText({ body }: { body: string }) {
  const paragraphs = paragraphsOf(body);
  if (paragraphs.length === 0) return <p className="soft">Nothing is written yet.</p>;
  return (
    <div className="summary-text">
      {paragraphs.map((paragraph, place) => (
        <Paragraph key={`${String(place)} ${paragraph}`} text={paragraph} />
      ))}
    </div>
  );
}

/** A paragraph, with its number drawn where it tells one. */
function Paragraph({ text }: { text: string }) {
  const told = numberTold(text);
  return (
    <>
      <p>{text}</p>
      {told && <HundredMarks outOf100={told.outOf100} label={`${told.words}, drawn as 100 small marks`} />}
    </>
  );
}
