import { type ReactNode, type RefObject, useLayoutEffect, useRef } from 'react';
import { ColumnsPanel } from '../columns/columns-panel';
import { DiscussPanel } from '../discuss/discuss-panel';
import { AssumptionPanel } from '../coexistence/assumption-panel';
import { SetsPanel } from '../coexistence/sets-panel';
import { TrialPanel } from '../trial/trial-panel';
import { CandidatesPanel } from '../evidence/candidates-panel';
import { type Panel, useLedger } from '../ledger/ledger-context';
import { FindingPanel } from './finding-panel';
import { GroupsPanel } from './groups-panel';
import { PooledPanel } from './pooled-panel';
import { PriorPanel } from './prior-panel';
import { RoundPanel } from './round-panel';
import { RowPanel } from './row-panel';
import { SealsPanel } from './seals-panel';
import { WhyPanel } from './why-panel';

interface Props {
  /** Back to the grid, where the person came from. */
  onClosed: () => void;
}

/** What stands at the side of the ledger; on a phone it comes from below. Without anything opened: the round. */
export function SidePanel({ onClosed }: Props) {
  const { panel, open } = useLedger();
  const box = useRef<HTMLElement>(null);
  const close = () => {
    open(null);
    onClosed();
  };
  useFocusOnOpen(box, panel);
  return (
    <aside
      ref={box}
      className="side"
      data-open={panel !== null || undefined}
      aria-label="At the side of the ledger"
      onKeyDown={(event) => {
        if (event.key === 'Escape' && panel && !event.defaultPrevented) {
          event.preventDefault();
          close();
        }
      }}
    >
      {panel && (
        <button type="button" className="side-close" onClick={close}>
          Close
        </button>
      )}
      {contents(panel)}
    </aside>
  );
}

function contents(panel: Panel | null): ReactNode {
  switch (panel?.kind) {
    case 'row':
      return <RowPanel key={panel.findingId} findingId={panel.findingId} />;
    case 'prior':
      return <PriorPanel />;
    case 'why':
      return <WhyPanel target={panel.target} column={panel.column} />;
    case 'pooled':
      return <PooledPanel />;
    case 'seals':
      return <SealsPanel />;
    case 'candidates':
      return <CandidatesPanel />;
    case 'discuss':
      return <DiscussPanel />;
    case 'columns':
      return <ColumnsPanel />;
    case 'assumption':
      return <AssumptionPanel />;
    case 'trial':
      return <TrialPanel findingId={panel.findingId} />;
    case 'sets':
      return <SetsPanel />;
    case 'groups':
      return <GroupsPanel />;
    case 'finding':
      return <FindingPanel key={panel.findingId} findingId={panel.findingId} />;
    default:
      return <RoundPanel />;
  }
}

/**
 * Moves the focus to where the person wants to go on: the field of the cell that they opened, else the heading. Before
 * the browser goes on with the key that opened it, so that a digit typed on the cell arrives in the field.
 */
function useFocusOnOpen(box: RefObject<HTMLElement | null>, panel: Panel | null): void {
  useLayoutEffect(() => {
    if (!panel || !box.current) return;
    // Choosing among what can be tried leaves the hand where it is.
    if (panel.kind === 'trial' && box.current.contains(document.activeElement)) return;
    const at = panel.kind === 'row' || panel.kind === 'prior' ? panel.at : null;
    const field = at && box.current.querySelector<HTMLInputElement>(`[data-field="${at.columnId}"]`);
    if (!field) {
      box.current.querySelector<HTMLElement>('h2')?.focus();
      return;
    }
    field.focus();
    field.select();
  }, [box, panel]);
}

/** The heading of what stands at the side; it takes the focus when it is opened. */
export function SideHeading({ children }: { children: ReactNode }) {
  return (
    <h2 className="side-heading" tabIndex={-1}>
      {children}
    </h2>
  );
}
