import { Caution } from '../../../components/caution';
import { PriorForm } from '../editor/prior-form';
import { useLedger } from '../ledger/ledger-context';

/** A contributor's first step in a round: the prior, while the rows are hidden. */
export function PriorFirst() {
  const { differential, columns } = useLedger();
  const { round } = differential;
  return (
    <section className="prior-first" aria-label="Differential">
      <h2 className="prior-first-title">First, before the findings: your prior</h2>
      <p className="soft prose">
        {round?.kind === 'sealed'
          ? 'Round ' +
            String(round.number) +
            ' is sealed: nobody sees your numbers before the chair unseals it. '
          : ''}
        The findings are hidden until your prior is saved, so that they are not counted twice.
      </p>
      <div className="prior-first-form">
        <PriorForm />
        <aside className="prior-first-side">
          <h3>Candidates</h3>
          <ul className="side-list">
            {columns.map((column) => {
              const candidate = differential.candidates.find((one) => one.id === column.id);
              return (
                <li key={column.id}>
                  {column.none ? 'None of these' : `${column.letter} ${column.name}`}
                  {column.mustNotMiss && <span className="small"> (must not miss)</span>}
                  {candidate && candidate.detail !== '' && (
                    <span className="small soft why-more">{candidate.detail}</span>
                  )}
                  {column.none && <span className="small soft why-more">Whatever else it may be.</span>}
                </li>
              );
            })}
          </ul>
        </aside>
      </div>
      <Caution />
    </section>
  );
}
