import { ShareBar } from '../../../components/marks/share-bar';
import { useLedger } from '../ledger/ledger-context';
import { SideHeading } from '../panels/side-panel';
import { explainSentences, leftOutSentence, restSentence, setSentences } from './set-words';

/** Which candidates are there together, how often, and which is needed less where another is there. */
export function SetsPanel() {
  const { differential, columns } = useLedger();
  const { assessment } = differential;
  if (!assessment || differential.settings.coexistence === 0)
    return (
      <>
        <SideHeading>Which combinations</SideHeading>
        <p className="soft">
          Under one cause the candidates exclude each other, so there are no combinations. Choose “may
          coexist” in the head of the ledger to see them.
        </p>
      </>
    );
  const explained = explainSentences(assessment, columns);
  const leftOut = leftOutSentence(assessment);
  const rest = restSentence(assessment);
  return (
    <>
      <SideHeading>Which combinations</SideHeading>
      <p className="side-about">
        A patient may have none, one or several of the candidates. These are the most likely, of all together
        100.
      </p>
      <ol className="set-list">
        {setSentences(assessment, columns).map(({ members, who, howMany, share }) => (
          <li key={members.join(' ')}>
            <span>
              {who}: <span className="set-share">{howMany}</span>
            </span>
            <ShareBar share={share} ticks={[]} own={null} none={members.length === 0} />
          </li>
        ))}
      </ol>
      {rest !== null && <p className="side-about">{rest}</p>}
      <h3 className="side-sub">If one is there, which is needed less</h3>
      {explained.length === 0 ? (
        <p className="soft">Here none makes another less needed by as much as 1 of 100.</p>
      ) : (
        <ul className="side-list">
          {explained.map((sentence) => (
            <li key={sentence}>{sentence}</li>
          ))}
        </ul>
      )}
      {leftOut !== null && <p className="note">{leftOut}</p>}
    </>
  );
}
