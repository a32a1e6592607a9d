import type { Case } from '@weighhouse/shared/contracts/cases';
import { NavLink } from 'react-router-dom';

interface Tab {
  to: string;
  label: string;
  count?: number;
}

function tabsOf({ counts, abilities }: Case): Tab[] {
  const tabs: (Tab & { needs: string })[] = [
    { to: 'history', label: 'History', needs: 'case.read' },
    { to: 'reports', label: 'Reports', count: counts.reports, needs: 'report.read' },
    { to: 'differential', label: 'Differential', needs: 'differential.read' },
    { to: 'next-test', label: 'Next test', count: counts.pending, needs: 'differential.read' },
    { to: 'plan', label: 'Plan', needs: 'plan.read' },
    { to: 'summary', label: 'Summary', needs: 'summary.read' },
    { to: 'trail', label: 'Trail', needs: 'trail.read' },
  ];
  return tabs.filter((tab) => abilities.includes(tab.needs));
}

/** The sections of a case that this person may open. */
export function CaseTabs({ of }: { of: Case }) {
  return (
    <nav className="case-tabs no-print" aria-label="Sections of this case">
      {tabsOf(of).map((tab) => (
        <NavLink key={tab.to} to={tab.to}>
          {tab.label}
          {tab.count !== undefined && tab.count > 0 && <span className="tab-count">{tab.count}</span>}
        </NavLink>
      ))}
    </nav>
  );
}
