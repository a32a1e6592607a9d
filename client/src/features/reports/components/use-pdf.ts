import type { PDFDocumentProxy } from 'pdfjs-dist';
import { useEffect, useState } from 'react';
import { contentPath } from '../api/list-reports';
import { openPdf } from './pdf-document';
import { useLoadFailure } from './use-load-failure';

/** Faults of the file itself: asking for it again does not help. */
const ofTheFile = new Set(['PasswordException', 'InvalidPDFException']);

export type FileFault = 'locked' | 'broken';

/** A report's PDF, opened once and closed with the page. */
export function usePdf(reportId: string) {
  const [opened, setOpened] = useState<{ attempt: number; pdf: PDFDocumentProxy } | null>(null);
  const [fileFault, setFileFault] = useState<FileFault | null>(null);
  const { attempt, error, failed, again } = useLoadFailure(reportId);
  useEffect(() => {
    let gone = false;
    const opening = openPdf(contentPath(reportId));
    opening.ready.then(
      (pdf) => {
        if (!gone) setOpened({ attempt, pdf });
      },
      (reason: unknown) => {
        if (gone) return;
        const { name } = reason as Error;
        if (ofTheFile.has(name)) setFileFault(name === 'PasswordException' ? 'locked' : 'broken');
        else failed();
      },
    );
    return () => {
      gone = true;
      opening.close();
    };
  }, [reportId, attempt, failed]);
  return { pdf: opened?.attempt === attempt ? opened.pdf : null, fileFault, error, again };
}
