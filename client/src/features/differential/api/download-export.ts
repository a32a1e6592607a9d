import { useMutation } from '@tanstack/react-query';
import { errorFrom } from '../../../lib/api';
import { offlineError } from '../../../lib/api-error';

export type ExportFormat = 'pdf' | 'letter' | 'fhir' | 'panel';
const endings: Record<ExportFormat, string> = { pdf: 'pdf', letter: 'pdf', fhir: 'json', panel: 'json' };

/** Fetches an export and hands it to the browser as a file, so that a refusal stays on this page. */
async function downloadExport(caseId: string, number: string, format: ExportFormat): Promise<void> {
  const response = await fetch(`/api/cases/${caseId}/export?format=${format}`, {
    credentials: 'same-origin',
  }).catch(() => {
    throw offlineError();
  });
  if (!response.ok) throw errorFrom(response.status, await response.text(), null);
  const url = URL.createObjectURL(await response.blob());
  const link = document.createElement('a');
  link.href = url;
  link.download =
    fileName(response.headers.get('content-disposition')) ?? `${number}-${format}.${endings[format]}`;
  link.click();
  // The browser reads the address after this turn.
  setTimeout(() => {
    URL.revokeObjectURL(url);
  }, 60_000);
}

function fileName(disposition: string | null): string | null {
  return /filename="?([^";]+)"?/.exec(disposition ?? '')?.[1] ?? null;
}

export const useDownloadExport = (caseId: string, number: string) =>
  useMutation({ mutationFn: (format: ExportFormat) => downloadExport(caseId, number, format) });
