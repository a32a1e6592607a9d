import { type ReactNode, useEffect } from 'react';

interface Props {
  /** What is so, as a sentence without a full stop. */
  children: string;
  /** One quiet line below. */
  note?: ReactNode;
  /** Buttons at the end of the line. */
  actions?: ReactNode;
}

/** The page's one title; the browser tab carries it too. */
export function PageTitle({ children, note, actions }: Props) {
  useDocumentTitle(children);
  return (
    <header className="page-title">
      <div>
        <h1>{children}</h1>
        {note !== undefined && <p className="soft">{note}</p>}
      </div>
      {actions !== undefined && <div className="actions no-print">{actions}</div>}
    </header>
  );
}

export function useDocumentTitle(title: string): void {
  useEffect(() => {
    document.title = `${title} · Weighhouse`;
  }, [title]);
}
