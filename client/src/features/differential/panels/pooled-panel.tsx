import { useFormat } from '../../../lib/use-format';
import { counted, listed } from '../../../lib/words';
import { useLedger } from '../ledger/ledger-context';
import { disagreementWords } from '../model/disagreement-words';
import { reliabilityWord } from '../model/finding-words';
import { voicesOf } from '../model/people';
import { methodSentences, pairWords } from '../pooled/method-words';
import { TakeAlong } from '../pooled/take-along';
import { partingWords } from '../pooled/two-pools';
import { TwoPoolsTable } from '../pooled/two-pools-table';
import { useInFull } from '../why-sum/use-in-full';
import { usePanelInForce } from '../why-sum/use-panel-in-force';
import { SideHeading } from './side-panel';
import { WithoutButton } from '../without/without-button';
import { useWeights } from './use-weights';

/** How the standing came about: method, weights, what was counted less, who was not in. */
export function PooledPanel() {
  const { differential, columns } = useLedger();
  const { panel } = usePanelInForce();
  const inFull = useInFull(panel);
  const { assessment, shownRound, sealed } = differential;
  if (!assessment)
    return (
      <>
        <SideHeading>How it is pooled</SideHeading>
        <p className="soft">
          {sealed
            ? 'The round is sealed. Nothing is pooled before the chair unseals it.'
            : 'Nothing is judged yet.'}
        </p>
        <Method method="weighhouse/1" />
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
      <TakeAlong />
      <Method method={assessment.method} />
      <Weights />
      <CountedLess />
      <h3 className="side-sub">Two ways to add up, and the range</h3>
      <p className="small soft">{partingWords(assessment, columns)}</p>
      <TwoPoolsTable assessment={assessment} inFull={inFull} />
      <p className="side-about">
        {disagreementWords(assessment.disagreementBits, Object.keys(assessment.own).length)}
      </p>
    </>
  );
}

function Method({ method }: { method: string }) {
  const { differential, columns } = useLedger();
  const { panel } = usePanelInForce();
  const format = useFormat();
  const { settings } = differential;
  const about = panel ?? { tempering: settings.tempering, coexistence: 0 };
  return (
    <p className="side-about">
      Method <span className="figures">{method}</span>.{' '}
      {methodSentences(about, pairWords(settings.together, columns)).join(' ')}
      {settings.lastChange && (
        <span className="small soft why-more">
          Last changed by {settings.lastChange.by}, {format.moment(settings.lastChange.at)}:{' '}
          {settings.lastChange.reason}
        </span>
      )}
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
                  <span className="small why-more">
                    <WithoutButton left={{ kind: 'contributor', id: voice.key }} name={voice.name} />
                  </span>
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
