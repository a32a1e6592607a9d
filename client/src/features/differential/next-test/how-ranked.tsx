import { settlesFrom } from './test-words';

/** What the words of this page stand for. */
export function HowRanked() {
  const { much, something, little } = settlesFrom;
  return (
    <details className="how-ranked">
      <summary>What settling is counted in</summary>
      <p>
        Bits: how far a result is expected to move the panel from where it stands, averaged over its possible
        results by how likely they are. One bit halves the doubt between two candidates that stand alike.
      </p>
      <p>
        From {much} bits a test settles much, from {something} something, from {little} little, below that
        hardly anything. These steps are ours.
      </p>
      <p>
        Cost, wait and burden are not turned into bits: nobody could say at what rate. A test is best for what
        it takes when no other settles as much for as little cost, wait and burden. Where a result is entered,
        the ledger can differ a little from what stands here, because findings that overlap are counted anew.
      </p>
    </details>
  );
}
