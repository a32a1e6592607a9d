import type { PDFDocumentProxy } from 'pdfjs-dist';
import { useCallback, useEffect, useState } from 'react';
import { openPdf } from './pdf-document';

/** A PDF by its address, opened once and closed with the page. */
export function usePdf(url: string) {
  const [attempt, setAttempt] = useState(0);
  const [pdf, setPdf] = useState<PDFDocumentProxy | null>(null);
  const [error, setError] = useState<unknown>(null);
  useEffect(() => {
    let gone = false;
    const opened = openPdf(url);
    opened.ready.then(
      (ready) => {
        if (!gone) setPdf(ready);
      },
      (failed: unknown) => {
        if (!gone) setError(failed);
      },
    );
    return () => {
      gone = true;
      opened.close();
    };
  }, [url, attempt]);
  const retry = useCallback(() => {
    setError(null);
    setPdf(null);
    setAttempt((count) => count + 1);
  }, []);
  return { pdf, error, retry };
}
