import { useQueryClient } from '@tanstack/react-query';
import { useMemo, useSyncExternalStore } from 'react';
import { uploadReport } from '../api/upload-report';
import { fileFault, uploadFault } from './file-check';
import { UploadQueue } from './upload-queue';

/** One queue for each case, outside the page, so that going to another section does not stop an upload. */
const queues = new Map<string, UploadQueue>();

export function useUploads(caseId: string) {
  const client = useQueryClient();
  const queue = useMemo(() => {
    const known = queues.get(caseId);
    if (known) return known;
    const made = new UploadQueue({
      send: (file, onProgress, signal) => uploadReport(caseId, file, onProgress, signal),
      check: fileFault,
      faultOf: (error, file) => uploadFault(error, file.size),
      onDone: () => {
        void client.invalidateQueries({ queryKey: ['case', caseId] });
      },
    });
    queues.set(caseId, made);
    return made;
  }, [client, caseId]);
  return { queue, uploads: useSyncExternalStore(queue.subscribe, queue.uploads) };
}
