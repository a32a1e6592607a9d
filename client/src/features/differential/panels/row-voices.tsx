import type { Finding } from '@weighhouse/shared/contracts/findings';
import { naturalFrequency } from '@weighhouse/shared/reasoning/natural-frequency';
import { useLedger } from '../ledger/ledger-context';
import { shownWords } from '../model/cell-words';
import { columnLabel } from '../model/columns';
import { rowVoices, type RowVoice } from '../model/row-voices';
import { useWeights } from './use-weights';

const exposureWords = { seldom: 'seldom', sometimes: 'sometimes', often: 'often' } as const;

/** Who said what about a whole row: people by candidates, with how often they see it, what they weigh, and why. */
export function RowVoices({ finding }: { finding: Finding }) {
  const { differential, columns } = useLedger();
  const { weightOf } = useWeights();
  if (!differential.assessment || !differential.others || finding.enteredInError) return null;
  const voices = rowVoices(differential, finding, columns.length, weightOf);
  if (voices.length === 0) return null;
  return (
    <section aria-label="Who said what">
      <h3 className="side-sub">Who said what</h3>
      <p className="small soft">
        Of 100 with each candidate, how many {shownWords(finding, finding.observed ?? 1)}; “–” is a blank.
      </p>
      <div className="voices-frame" tabIndex={0} role="group" aria-label="Numbers of each contributor">
        <table className="why-table voices-table">
          <thead>
            <tr>
              <th scope="col">Who</th>
              {columns.map((column) => (
                <th key={column.id} scope="col" className="why-number" title={column.name}>
                  <span aria-hidden="true">{column.letter}</span>
                  <span className="aside-text">{columnLabel(column)}</span>
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {voices.map((line) => (
              <VoiceRow key={line.voice.key} line={line} />
            ))}
          </tbody>
        </table>
      </div>
    </section>
  );
}

function VoiceRow({ line }: { line: RowVoice }) {
  const { voice, exposure, weight, reason, shares } = line;
  const said = reason !== null && reason !== '';
  return (
    <>
      <tr data-you={voice.you || undefined} data-more={said || undefined}>
        <th scope="row">
          {voice.name}
          <span className="small soft why-more">
            Sees it {exposureWords[exposure]}
            {weight !== null && `, weight ${String(weight)}`}
          </span>
        </th>
        {shares.map((share, index) => (
          <td key={index} className="figures why-number">
            {share === null ? '–' : short(naturalFrequency(share).outOf100)}
          </td>
        ))}
      </tr>
      {said && (
        <tr>
          <td className="small" colSpan={shares.length + 1}>
            “{reason}”
          </td>
        </tr>
      )}
    </>
  );
}

/** In so narrow a column a sign stands for the word, which a screen reader still says. */
function short(outOf100: number | 'under 1' | 'over 99') {
  if (typeof outOf100 === 'number') return outOf100;
  return (
    <>
      <span aria-hidden="true">{outOf100 === 'under 1' ? '<1' : '>99'}</span>
      <span className="aside-text">{outOf100}</span>
    </>
  );
}
