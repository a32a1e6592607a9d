import { getDocument, GlobalWorkerOptions, type PDFDocumentProxy } from 'pdfjs-dist';
import workerUrl from 'pdfjs-dist/build/pdf.worker.min.mjs?url';

GlobalWorkerOptions.workerSrc = workerUrl;

/**
 * Opens a PDF in pdf.js's own worker. Nothing in the file is run: no scripts, no forms, no eval; and nothing is fetched
 * from elsewhere, because fonts, character maps and decoders are shipped under /pdf.
 */
export function openPdf(url: string): { ready: Promise<PDFDocumentProxy>; close: () => void } {
  const task = getDocument({
    url,
    withCredentials: true,
    isEvalSupported: false,
    enableXfa: false,
    cMapUrl: '/pdf/cmaps/',
    cMapPacked: true,
    standardFontDataUrl: '/pdf/standard_fonts/',
    wasmUrl: '/pdf/wasm/',
    iccUrl: '/pdf/iccs/',
  });
  return {
    ready: task.promise,
    close: () => {
      void task.destroy();
    },
  };
}
