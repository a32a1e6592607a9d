import { naturalFrequency } from '@weighhouse/shared/reasoning/natural-frequency';
import { useState } from 'react';
import { ShareBar } from '../../../components/marks/share-bar';
import { CombinationsButton } from '../coexistence/combinations-button';
import { useLedger } from '../ledger/ledger-context';
import { MovingFigure } from '../ledger/moving-figure';
import { type Column, columnLabel } from '../model/columns';
import { leadingColumns } from '../model/leading-columns';
import { useWithout } from '../without/without-context';
import { standingSentence, standingView } from '../model/standing-view';

/** Where the panel stands, at the bottom of a phone: the leading candidates, and all of them on demand. */
export function CompactStanding() {
  const { differential, columns, reading } = useLedger();
  const [all, setAll] = useState(false);
  const pointed = useWithout();
  // Only what a button holds: at the lower edge a change under the pointer would move what is pointed at.
  const without = pointed?.held === true ? pointed : null;
  const standing = differential.assessment?.standing ?? differential.mine?.standing ?? null;
  const shown = all ? columns : leadingColumns(columns, standing, 3);
  const sealed = differential.sealed && !differential.assessment;
  return (
    <section className="compact-standing" aria-label="Where the panel stands">
      <div className="compact-head">
        <h2>{reading.panelsOwn ? 'Where the panel stands' : 'Where the panel would stand'}</h2>
        <button
          type="button"
          className="text-button"
          aria-expanded={all}
          onClick={() => {
            setAll(!all);
          }}
        >
          {all ? 'Fewer' : `All ${String(columns.length)}`}
        </button>
      </div>
      {sealed && <p className="small soft">Sealed until the chair unseals the round.</p>}
      {!sealed && !differential.assessment && <p className="small soft">Nothing judged yet.</p>}
      {without && (
        <p className="small">
          <b>{without.sentence}</b>
        </p>
      )}
      <CombinationsButton />
      <ul>
        {shown.map((column) => (
          <Line key={column.id} column={column} />
        ))}
      </ul>
    </section>
  );
}

function Line({ column }: { column: Column }) {
  const { differential, open } = useLedger();
  const view = standingView(differential, column.index);
  const pointed = useWithout();
  const without = pointed?.held === true ? (pointed.standing?.[column.index] ?? null) : null;
  return (
    <li>
      {view.share === null ? (
        <span className="cell-list-name">{columnLabel(column)}</span>
      ) : (
        <button
          type="button"
          className="text-button cell-list-name"
          aria-label={`Why ${columnLabel(column)} stands there`}
          onClick={() => {
            open({ kind: 'why', target: 'standing', column: column.index });
          }}
        >
          {columnLabel(column)}
        </button>
      )}
      {view.sealed ? (
        <span className="ledger-sealed" aria-hidden="true" />
      ) : (
        <ShareBar share={view.share} ticks={view.ticks} own={view.own} none={column.none} />
      )}
      <span className="compact-share figures">
        {view.share !== null && without === null && <MovingFigure share={view.share} percent />}
        {without !== null && `${String(naturalFrequency(without).outOf100)} without`}
        {view.share === null && view.own !== null && `you ${naturalFrequency(view.own).percent}`}
      </span>
      <span className="aside-text">
        {view.share !== null && `${naturalFrequency(view.share).words} like this. `}
        {standingSentence(view)}
      </span>
    </li>
  );
}
