import { type LeftOut, leftOutAttribute } from './left-out';
import { useCanLeaveOut, useWithout, useWithoutStore } from './without-context';

/** Shows the standing without a finding or a contributor until it is pressed again; for touch and for everybody. */
export function WithoutButton({ left, name }: { left: LeftOut; name: string }) {
  const store = useWithoutStore();
  const without = useWithout();
  const can = useCanLeaveOut();
  if (!can(left)) return null;
  const held = without?.held === true && without.left.kind === left.kind && without.left.id === left.id;
  return (
    <span className="without-place" data-without={leftOutAttribute(left)}>
      <button
        type="button"
        className="text-button"
        aria-pressed={held}
        aria-label={`The standing without ${name}`}
        onClick={() => {
          if (held) store.end();
          else store.hold(left);
        }}
      >
        Standing without
      </button>
      {held && <span className="without-said">{without.sentence}</span>}
    </span>
  );
}
