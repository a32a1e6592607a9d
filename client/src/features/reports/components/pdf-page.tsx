import { type PDFDocumentProxy, type RenderTask, TextLayer } from 'pdfjs-dist';
import { useEffect, useRef, useState } from 'react';

interface Props {
  pdf: PDFDocumentProxy;
  page: number;
  zoom: number;
}

/** More pixels than this on a side fail in some browsers. */
const mostPixels = 6000;

/** One page: its picture, with its text laid over it for selecting and for screen readers. */
export function PdfPage({ pdf, page, zoom }: Props) {
  const frame = useRef<HTMLDivElement>(null);
  const canvas = useRef<HTMLCanvasElement>(null);
  const text = useRef<HTMLDivElement>(null);
  const [failed, setFailed] = useState(false);
  const width = useWidth(frame);

  useEffect(() => {
    if (width === 0) return;
    let gone = false;
    let task: RenderTask | undefined;
    const draw = async () => {
      const found = await pdf.getPage(page);
      const fitting = width / found.getViewport({ scale: 1 }).width;
      const viewport = found.getViewport({ scale: fitting * zoom });
      const sheet = canvas.current;
      const over = text.current;
      if (gone || !sheet || !over) return;
      const sharp = Math.min(devicePixelRatio, mostPixels / Math.max(viewport.width, viewport.height));
      sheet.width = Math.floor(viewport.width * sharp);
      sheet.height = Math.floor(viewport.height * sharp);
      sheet.style.width = `${String(viewport.width)}px`;
      sheet.style.height = `${String(viewport.height)}px`;
      over.replaceChildren();
      over.style.setProperty('--total-scale-factor', String(viewport.scale));
      task = found.render({ canvas: sheet, viewport, transform: [sharp, 0, 0, sharp, 0, 0] });
      await task.promise;
      await new TextLayer({
        textContentSource: await found.getTextContent(),
        container: over,
        viewport,
      }).render();
      setFailed(false);
    };
    draw().catch((error: unknown) => {
      if (!gone && (error as Error).name !== 'RenderingCancelledException') setFailed(true);
    });
    return () => {
      gone = true;
      task?.cancel();
    };
  }, [pdf, page, zoom, width]);

  return (
    <div ref={frame}>
      {failed && <p className="failure-line">This page could not be drawn. The download has it.</p>}
      <div className="pdf-sheet">
        <canvas ref={canvas} aria-hidden="true" />
        <div ref={text} className="textLayer" />
      </div>
    </div>
  );
}

/** The width there is for a page, following the window. */
function useWidth(frame: React.RefObject<HTMLDivElement | null>): number {
  const [width, setWidth] = useState(0);
  useEffect(() => {
    const box = frame.current;
    if (!box) return;
    const observer = new ResizeObserver(() => {
      setWidth(Math.floor(box.clientWidth));
    });
    observer.observe(box);
    return () => {
      observer.disconnect();
    };
  }, [frame]);
  return width;
}
