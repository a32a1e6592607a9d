import { type ReactNode, useEffect, useState } from 'react';

/** Shows its children only after 300 ms, so that a quick answer does not flash. */
function AfterAWhile({ children }: { children: ReactNode }) {
  const [shown, setShown] = useState(false);
  useEffect(() => {
    const timer = setTimeout(() => {
      setShown(true);
    }, 300);
    return () => {
      clearTimeout(timer);
    };
  }, []);
  return (
    <div role="status">
      <span className="aside-text">Loading</span>
      {shown && children}
    </div>
  );
}

const line = (key: number, width: string) => <span key={key} className="skeleton-line" style={{ width }} />;

/** Ruled rows as lists and tables have them. */
export function SkeletonRows({ rows = 5 }: { rows?: number }) {
  return (
    <AfterAWhile>
      {Array.from({ length: rows }, (_, row) => (
        <div key={row} className="skeleton-row">
          {line(0, '72px')}
          {line(1, `${String(38 + ((row * 13) % 30))}%`)}
          {line(2, '90px')}
        </div>
      ))}
    </AfterAWhile>
  );
}

/** A title and paragraphs. */
export function SkeletonText({ lines = 6 }: { lines?: number }) {
  return (
    <AfterAWhile>
      <div className="skeleton-text">
        <span className="skeleton-line skeleton-title" />
        {Array.from({ length: lines }, (_, row) => line(row, `${String(92 - ((row * 17) % 35))}%`))}
      </div>
    </AfterAWhile>
  );
}

/** A whole page: title, note, ruled rows. */
export function SkeletonPage({ rows = 6 }: { rows?: number }) {
  return (
    <div className="page">
      <SkeletonText lines={1} />
      <SkeletonRows rows={rows} />
    </div>
  );
}
