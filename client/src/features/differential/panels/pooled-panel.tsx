import { naturalFrequency } from '@weighhouse/shared/reasoning/natural-frequency';
import { counted, listed } from '../../../lib/words';
import { useLedger } from '../ledger/ledger-context';
import { columnLabel } from '../model/columns';
import { disagreementWords } from '../model/disagreement-words';
import { reliabilityWord } from '../model/finding-words';
import { voicesOf } from '../model/people';
import { SideHeading } from './side-panel';
import { useWeights } from './use-weights';

/** How the standing came about: method, weights, what was counted less, who was not in. */
export function PooledPanel() {
  const { differential, columns } = useLedger();
  const { assessment, settings, shownRound, sealed } = differential;
  if (!assessment)
    return (
      <>
        <SideHeading>How it is pooled</SideHeading>
        <p className="soft">
          {sealed
            ? 'The round is sealed. Nothing is pooled before the chair unseals it.'
            : 'Nothing is judged yet.'}
        </p>
        <Method method="weighhouse/1" tempering={settings.tempering} />
      </>
    );
  return (
    <>
      <SideHeading>How it was pooled</SideHeading>
      {shownRound && (
        <p className="side-about">
          Round {shownRound.number}
          {shownRound.live ? ', live: every saved judgement is pooled at once.' : ', as it was unsealed.'}
          {shownRound.notIn.length > 0 && ` Not in, so not counted: ${listed(shownRound.notIn)}.`}
        </p>
      )}
      <Method method={assessment.method} tempering={settings.tempering} />
      <Weights />
      <CountedLess />
      <h3 className="side-sub">Two ways to add up, and the range</h3>
      <p className="small soft">
        The average of where each stands alone keeps dissent visible. The range runs over leaving out each
        contributor and each finding, and over stronger and no tempering.
      </p>
      <table className="why-table">
        <thead>
          <tr>
            <th scope="col">Of 100</th>
            <th scope="col" className="why-number">
              Pool
            </th>
            <th scope="col" className="why-number">
              Average
            </th>
            <th scope="col" className="why-number">
              Range
            </th>
          </tr>
        </thead>
        <tbody>
          {columns.map((column) => (
            <tr key={column.id}>
              <th scope="row">{columnLabel(column)}</th>
              <td className="figures why-number">{whole(assessment.standing[column.index])}</td>
              <td className="figures why-number">{whole(assessment.linearPool[column.index])}</td>
              <td className="figures why-number">
                {whole(assessment.range[column.index]?.low)} to {whole(assessment.range[column.index]?.high)}
              </td>
            </tr>
          ))}
        </tbody>
      </table>
      <p className="side-about">
        {disagreementWords(assessment.disagreementBits, Object.keys(assessment.own).length)}
      </p>
    </>
  );
}

const whole = (share: number | undefined) => (share === undefined ? '–' : naturalFrequency(share).outOf100);

function Method({ method, tempering }: { method: string; tempering: number }) {
  return (
    <p className="side-about">
      Logarithmic opinion pool, method <span className="figures">{method}</span>: priors and likelihoods of
      all contributors are averaged by weight on the scale of log odds, then every finding is counted one
      after the other. Every finding counts {Math.round(tempering * 100)} of 100 of its full strength
      (tempering), because findings in one patient overlap more than anyone can list. One cause is assumed:
      the candidates exclude each other.
    </p>
  );
}

function Weights() {
  const { differential } = useLedger();
  const { memberOf, weightOf } = useWeights();
  const voices = voicesOf(differential);
  return (
    <>
      <h3 className="side-sub">Whose numbers</h3>
      <table className="why-table">
        <thead>
          <tr>
            <th scope="col">Who</th>
            <th scope="col">Prior</th>
            <th scope="col" className="why-number">
              Rows
            </th>
            <th scope="col" className="why-number">
              Weight
            </th>
          </tr>
        </thead>
        <tbody>
          {voices.map((voice) => {
            const person = voice.you
              ? differential.mine
              : differential.others?.find((other) => other.key === voice.key);
            const reason = memberOf(voice)?.reason;
            const judged =
              person?.findings.filter((row) => row.outOf100.some((cell) => cell !== null)).length ?? 0;
            return (
              <tr key={voice.key} data-you={voice.you || undefined}>
                <th scope="row">
                  {voice.name}
                  {reason != null && reason !== '' && <span className="small soft why-more">{reason}</span>}
                </th>
                <td>{person?.prior ? (person.priorInForce ? 'given' : 'of an earlier set') : 'none'}</td>
                <td className="figures why-number">{judged}</td>
                <td className="figures why-number">{weightOf(voice) ?? '–'}</td>
              </tr>
            );
          })}
        </tbody>
      </table>
      <p className="small soft">
        On a row a judgement counts weight times exposure: seldom a quarter, sometimes half, often in full. A
        blank is no opinion and has no weight.
      </p>
    </>
  );
}

/** Findings whose report is not firm, and groups that one mechanism explains. */
function CountedLess() {
  const { differential, rows } = useLedger();
  const { groups } = differential.settings;
  const doubted = rows.filter((row) => row.reliability < 0.995 && !row.enteredInError);
  const members = (id: string) => rows.filter((row) => row.groupId === id && !row.enteredInError);
  const used = groups.filter((group) => members(group.id).length > 0);
  if (doubted.length === 0 && used.length === 0) return null;
  return (
    <>
      <h3 className="side-sub">What counts less</h3>
      <ul className="side-list">
        {doubted.map((row) => (
          <li key={row.id}>
            {row.title}: the report is {reliabilityWord(row.reliability)}
          </li>
        ))}
        {used.map((group) => (
          <li key={group.id}>
            {group.label}: {counted(members(group.id).length, 'finding')} of one mechanism, overlap{' '}
            {Math.round(group.overlap * 100)} of 100
            {group.reason !== null && group.reason !== '' && <span className="soft">. {group.reason}</span>}
          </li>
        ))}
      </ul>
    </>
  );
}
