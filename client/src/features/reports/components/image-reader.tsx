import type { Report } from '@weighhouse/shared/contracts/reports';
import { useState } from 'react';
import { Failure } from '../../../components/failure';
import { contentPath } from '../api/list-reports';
import { useLoadFailure } from './use-load-failure';
import { ZoomButtons } from './zoom-buttons';

/** A picture; it scrolls in its own frame when it is enlarged. */
export function ImageReader({ report }: { report: Report }) {
  const [zoom, setZoom] = useState(1);
  const { attempt, error, failed, again } = useLoadFailure(report.id);
  if (error !== null) return <Failure error={error} what="The picture could not be loaded." retry={again} />;
  return (
    <>
      <div className="reader-tools">
        <ZoomButtons zoom={zoom} onZoom={setZoom} />
      </div>
      <div className="reader-frame" tabIndex={0} role="region" aria-label="Picture">
        <img
          key={attempt}
          src={contentPath(report.id)}
          alt={`Report ${report.fileName}`}
          style={{ width: `${String(zoom * 100)}%` }}
          onError={failed}
        />
      </div>
    </>
  );
}
