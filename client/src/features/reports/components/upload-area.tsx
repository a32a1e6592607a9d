import { Button } from '@radix-ui/themes';
import { reportKinds } from '@weighhouse/shared/contracts/reports';
import { useDropzone } from 'react-dropzone';
import { sizeWords } from '../../../lib/words';
import { kindsLine, sizeLine } from './file-check';
import type { Upload } from './upload-queue';
import { useUploads } from './use-uploads';

const endings = reportKinds.flatMap((kind) => [...kind.endings]).join(',');

/** Takes files by drop or by the button, shows how far each is, and what to do with one that failed. */
export function UploadArea({ caseId }: { caseId: string }) {
  const { queue, uploads } = useUploads(caseId);
  // Every file is taken, also one that will be refused: it is then listed with the reason.
  const zone = useDropzone({
    noClick: true,
    noKeyboard: true,
    onDrop: (files) => {
      queue.add(files);
    },
  });
  return (
    <div
      {...zone.getRootProps({ role: undefined, tabIndex: undefined })}
      className={`upload-area${zone.isDragActive ? ' upload-over' : ''}`}
    >
      <input {...zone.getInputProps({ accept: endings, 'aria-label': 'Files to upload' })} />
      <div className="actions">
        <Button type="button" variant="outline" color="gray" highContrast onClick={zone.open}>
          Choose files
        </Button>
        <span className="soft small">
          or drop them here. {kindsLine}, {sizeLine} each, several at once.
        </span>
      </div>
      <ul className="upload-list">
        {uploads.map((upload) => (
          <UploadRow
            key={upload.id}
            upload={upload}
            onCancel={() => {
              queue.cancel(upload.id);
            }}
            onRetry={() => {
              queue.retry(upload.id);
            }}
          />
        ))}
      </ul>
      <p className="aside-text" role="status">
        {uploads.length === 0 ? '' : summary(uploads)}
      </p>
    </div>
  );
}

function summary(uploads: readonly Upload[]): string {
  const failed = uploads.filter((upload) => upload.state === 'failed').length;
  const going = uploads.length - failed;
  return `${String(going)} on the way, ${String(failed)} not sent`;
}

function UploadRow({
  upload,
  onCancel,
  onRetry,
}: {
  upload: Upload;
  onCancel: () => void;
  onRetry: () => void;
}) {
  const { file, state, sent, fault } = upload;
  const percent = Math.floor(sent * 100);
  return (
    <li className="upload-row">
      <div className="upload-name">
        {file.name} <span className="soft small">{sizeWords(file.size)}</span>
        {state === 'sending' && <progress max={1} value={sent} aria-label={`Sending ${file.name}`} />}
        {fault !== null && <p className="failure-line">{fault}</p>}
      </div>
      <span className="figures small soft">
        {state === 'waiting' && 'waits'}
        {state === 'sending' && (percent < 100 ? `${String(percent)}%` : 'being checked')}
      </span>
      <div className="actions">
        {state === 'failed' && upload.retry && (
          <Button
            type="button"
            size="1"
            variant="outline"
            onClick={onRetry}
            aria-label={`Try again: ${file.name}`}
          >
            Try again
          </Button>
        )}
        <Button
          type="button"
          size="1"
          variant="outline"
          color="gray"
          highContrast
          onClick={onCancel}
          aria-label={`${state === 'failed' ? 'Take off the list' : 'Cancel'}: ${file.name}`}
        >
          {state === 'failed' ? 'Take off the list' : 'Cancel'}
        </Button>
      </div>
    </li>
  );
}
