import { Button } from '@radix-ui/themes';
import type { Report } from '@weighhouse/shared/contracts/reports';
import { contentPath } from '../api/list-reports';
import { ImageReader } from './image-reader';
import { PdfReader } from './pdf-reader';
import { TextReader } from './text-reader';

export interface ReaderProps {
  report: Report;
  page: number;
  onPage: (page: number) => void;
}

/** Reads a report in the page, by its kind. */
export default function Reader({ onClose, ...props }: ReaderProps & { onClose: () => void }) {
  const { report } = props;
  return (
    <section className="reader" aria-label={`Report ${report.fileName}`}>
      <div className="section-head reader-head">
        <h2>{report.fileName}</h2>
        <div className="actions">
          <a href={contentPath(report.id)} download={report.fileName} className="small">
            Download
          </a>
          <Button type="button" size="1" variant="outline" color="gray" highContrast onClick={onClose}>
            Close report
          </Button>
        </div>
      </div>
      <Content {...props} />
    </section>
  );
}

function Content(props: ReaderProps) {
  const { mediaType } = props.report;
  if (mediaType === 'application/pdf') return <PdfReader {...props} />;
  if (mediaType.startsWith('image/')) return <ImageReader report={props.report} />;
  return <TextReader report={props.report} />;
}
