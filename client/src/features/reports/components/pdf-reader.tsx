import { Button, TextField } from '@radix-ui/themes';
import { type KeyboardEvent, useState } from 'react';
import { Failure } from '../../../components/failure';
import { SkeletonText } from '../../../components/skeleton';
import { PdfPage } from './pdf-page';
import type { ReaderProps } from './reader';
import { type FileFault, usePdf } from './use-pdf';
import { pageForKey, zoomed } from './zoom';
import { ZoomButtons } from './zoom-buttons';

const faultWords: Record<FileFault, string> = {
  locked: 'This PDF is locked with a password, so it cannot be read here. Ask for it without one.',
  broken:
    'This PDF is damaged and cannot be read here. Ask for it again, or download it and try another program.',
};

/** A PDF page by page; arrow keys, Page Up and Down, Home and End turn pages, plus and minus zoom. */
export function PdfReader({ report, page: asked, onPage }: ReaderProps) {
  const { pdf, fileFault, error, again } = usePdf(report.id);
  const [zoom, setZoom] = useState(1);
  if (fileFault !== null) return <p className="failure">{faultWords[fileFault]}</p>;
  if (error !== null) return <Failure error={error} what="The report could not be loaded." retry={again} />;
  if (!pdf) return <SkeletonText lines={12} />;
  const pages = pdf.numPages;
  const page = Math.min(asked, pages);

  const onKeyDown = (event: KeyboardEvent) => {
    if (event.target !== event.currentTarget || event.ctrlKey || event.metaKey || event.altKey) return;
    const next = pageForKey(event.key, page, pages);
    // An enlarged page is scrolled sideways with the same keys.
    if (next !== null && !(zoom > 1 && event.key.startsWith('Arrow'))) {
      event.preventDefault();
      if (next !== page) onPage(next);
    }
    if (event.key === '+') setZoom(zoomed(zoom, 1));
    if (event.key === '-') setZoom(zoomed(zoom, -1));
  };

  return (
    <>
      <div className="reader-tools">
        <Turn label="Previous page" to={page - 1} pages={pages} onPage={onPage} />
        <PageNumber key={page} page={page} pages={pages} onPage={onPage} />
        <Turn label="Next page" to={page + 1} pages={pages} onPage={onPage} />
        <ZoomButtons zoom={zoom} onZoom={setZoom} />
      </div>
      <div
        className="reader-frame"
        tabIndex={0}
        role="region"
        aria-label={`Page ${String(page)} of ${String(pages)}`}
        onKeyDown={onKeyDown}
      >
        <PdfPage pdf={pdf} page={page} zoom={zoom} />
      </div>
    </>
  );
}

interface TurnProps {
  pages: number;
  onPage: (page: number) => void;
}

function Turn({ label, to, pages, onPage }: TurnProps & { label: string; to: number }) {
  return (
    <Button
      type="button"
      size="1"
      variant="outline"
      color="gray"
      highContrast
      disabled={to < 1 || to > pages}
      onClick={() => {
        onPage(to);
      }}
    >
      {label}
    </Button>
  );
}

function PageNumber({ page, pages, onPage }: TurnProps & { page: number }) {
  const [typed, setTyped] = useState(String(page));
  const go = () => {
    const wanted = Number.parseInt(typed, 10);
    if (wanted >= 1 && wanted <= pages && wanted !== page) onPage(wanted);
    else setTyped(String(page));
  };
  return (
    <form
      className="page-number"
      onSubmit={(event) => {
        event.preventDefault();
        go();
      }}
    >
      <TextField.Root
        size="1"
        aria-label="Page"
        inputMode="numeric"
        value={typed}
        onBlur={go}
        onChange={(event) => {
          setTyped(event.target.value);
        }}
      />
      <span className="small soft">of {pages}</span>
    </form>
  );
}
