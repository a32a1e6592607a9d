import './marks.css';

/** What each mark means. Beside every picture that uses them. */
export function MarksKey({ own, sealed, before }: { own: boolean; sealed: boolean; before: boolean }) {
  return (
    <ul className="marks-key" aria-label="Key of the marks">
      {!sealed && (
        <>
          <li>
            <span className="key-pool" aria-hidden="true" />
            the pool
          </li>
          <li>
            <span className="key-tick" aria-hidden="true" />
            each contributor
          </li>
        </>
      )}
      {own && (
        <li>
          <span className="mark-diamond mark-diamond--inline" aria-hidden="true" />
          you
        </li>
      )}
      {before && (
        <li>
          <span className="key-before" aria-hidden="true" />
          before this round
        </li>
      )}
      {!sealed && (
        <li>
          <span className="key-range" aria-hidden="true" />
          range
        </li>
      )}
      <li>
        <span className="key-pending" aria-hidden="true" />
        not known yet
      </li>
      {sealed ? (
        <li>
          <span className="key-sealed" aria-hidden="true" />
          sealed
        </li>
      ) : (
        <li>
          Beam right of centre: counts for. Left: counts against. Arrow: beyond 6 decibans, about 4 times as
          often.
        </li>
      )}
    </ul>
  );
}
