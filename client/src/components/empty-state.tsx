import type { ReactNode } from 'react';

/** An empty list: what is so, what to do next, and where it can be done. */
export function EmptyState({
  title,
  children,
  action,
}: {
  title: string;
  children?: ReactNode;
  action?: ReactNode;
}) {
  return (
    <div className="empty-state">
      <p className="empty-title">{title}</p>
      {children !== undefined && <p className="soft prose">{children}</p>}
      {action}
    </div>
  );
}
