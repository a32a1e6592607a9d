import { useLedger } from '../ledger/ledger-context';
import { SideHeading } from '../panels/side-panel';
import { AssumptionSwitch } from '../reading/assumption-switch';
import { assumptionWords } from '../reading/reading-words';
import { Pairs } from './pairs';
import { ShareForm } from './share-form';

/** What the two assumptions mean, what the case has, and where the chair sets it. */
export function AssumptionPanel() {
  const { saved, may } = useLedger();
  return (
    <>
      <SideHeading>One cause, or several at once</SideHeading>
      <div className="side-about">
        <p>
          <b>One cause</b>: the candidates exclude each other, and all shares sum to 100.
        </p>
        <p>
          <b>May coexist</b>: a patient may have several. Each candidate has a share of its own, and what one
          explains makes another less needed.
        </p>
        <p>
          The numbers given are the same. On this case the panel reads them as{' '}
          {assumptionWords(saved.settings.coexistence)}.
        </p>
      </div>
      <p>
        For yourself: <AssumptionSwitch />
      </p>
      <h3 className="side-sub">Two or more at once</h3>
      {may('settings.change') ? (
        <ShareForm />
      ) : (
        <p className="soft">The chair says how many of 100 patients like this have two or more.</p>
      )}
      <Pairs />
    </>
  );
}
