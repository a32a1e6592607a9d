import { readError } from '../../../lib/api';
import { offlineError } from '../../../lib/api-error';
import { waitForSignIn } from '../../../lib/session';
import { contentPath } from './list-reports';

/**
 * A report's content. Where the session is over it waits for the person to sign in again, as every request does.
 * @param range the part that is asked for, as in an HTTP Range header; all of it by default
 * @throws ApiError by the server's id, `offline` without an answer
 */
export async function getContent(reportId: string, signal: AbortSignal, range?: string): Promise<Response> {
  const response = await fetch(contentPath(reportId), {
    signal,
    ...(range === undefined ? {} : { headers: { range } }),
  }).catch((error: unknown) => {
    if (signal.aborted) throw error;
    throw offlineError();
  });
  if (response.ok) return response;
  const error = await readError(response);
  if (error.id === 'signed-out' && (await waitForSignIn(signal))) return getContent(reportId, signal, range);
  throw error;
}

/**
 * Asks for the first byte. A picture and a PDF are loaded by the browser's own means, which tell that they failed and not
 * why: this resolves when the content can be had after all, and throws the reason when not.
 */
export async function tryContent(reportId: string, signal: AbortSignal): Promise<void> {
  await (await getContent(reportId, signal, 'bytes=0-0')).body?.cancel();
}
