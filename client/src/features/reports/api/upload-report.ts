import { type Report, reportSchema } from '@weighhouse/shared/contracts/reports';
import { ApiError, errorFrom } from '../../../lib/api';
import { offlineError } from '../../../lib/api-error';
import { waitForSignIn } from '../../../lib/session';

/**
 * Uploads one file. XMLHttpRequest, because fetch does not tell how much of a body has been sent.
 * @param onProgress called with the share that is sent, 0 to 1
 * @throws ApiError as the API client does; an AbortError when `signal` is aborted
 */
export async function uploadReport(
  caseId: string,
  file: File,
  onProgress: (share: number) => void,
  signal: AbortSignal,
): Promise<Report> {
  const answer = await send(caseId, file, onProgress, signal);
  if (answer.status >= 200 && answer.status < 300) {
    const parsed = reportSchema.safeParse(JSON.parse(answer.text));
    if (parsed.success) return parsed.data;
    throw new ApiError('unreadable', 'The server answered with something this page cannot read.', {
      status: answer.status,
    });
  }
  const error = errorFrom(answer.status, answer.text, answer.retryAfter);
  if (error.id === 'signed-out' && (await waitForSignIn(signal)))
    return uploadReport(caseId, file, onProgress, signal);
  throw error;
}

interface Answer {
  status: number;
  text: string;
  retryAfter: string | null;
}

function send(
  caseId: string,
  file: File,
  onProgress: (share: number) => void,
  signal: AbortSignal,
): Promise<Answer> {
  return new Promise((resolve, reject) => {
    const request = new XMLHttpRequest();
    request.open('POST', `/api/cases/${caseId}/reports`);
    request.setRequestHeader('accept', 'application/json');
    request.upload.onprogress = (event) => {
      if (event.lengthComputable) onProgress(event.loaded / event.total);
    };
    request.onload = () => {
      const { status, responseText } = request;
      resolve({ status, text: responseText, retryAfter: request.getResponseHeader('retry-after') });
    };
    request.onerror = () => {
      reject(offlineError());
    };
    request.onabort = () => {
      reject(new DOMException('cancelled', 'AbortError'));
    };
    signal.addEventListener('abort', () => {
      request.abort();
    });
    const body = new FormData();
    body.append('file', file, file.name);
    request.send(body);
  });
}
