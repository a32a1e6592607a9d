import { errorBodySchema } from '@weighhouse/shared/contracts/errors';
import type { z } from 'zod';
import { ApiError, offlineError } from './api-error';
import { waitForSignIn } from './session';

export { ApiError, isApiError } from './api-error';

type Method = 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';

interface Options<S extends z.ZodType> {
  schema: S;
  body?: unknown;
  signal?: AbortSignal | undefined;
  /** False for the session's own routes: a missing session is an answer there, not an interruption. */
  wait?: boolean;
}

/**
 * Sends JSON and parses the answer with its contract.
 * @param path begins with /api
 * @throws ApiError by the server's id, `offline` without an answer, `unreadable` when it is not what was agreed
 */
export async function request<S extends z.ZodType>(
  method: Method,
  path: string,
  { schema, body, signal, wait = true }: Options<S>,
): Promise<z.output<S>> {
  const response = await send(method, path, body, signal);
  if (response.ok) return readAnswer(response, schema);
  const error = await readError(response);
  if (error.id === 'signed-out' && wait && (await waitForSignIn(signal)))
    return request(method, path, { schema, body, signal, wait });
  throw error;
}

export const get = <S extends z.ZodType>(path: string, schema: S, signal?: AbortSignal) =>
  request('GET', path, { schema, signal });
export const post = <S extends z.ZodType>(path: string, schema: S, body?: unknown) =>
  request('POST', path, { schema, body });
export const put = <S extends z.ZodType>(path: string, schema: S, body?: unknown) =>
  request('PUT', path, { schema, body });
export const patch = <S extends z.ZodType>(path: string, schema: S, body?: unknown) =>
  request('PATCH', path, { schema, body });
export const del = <S extends z.ZodType>(path: string, schema: S, body?: unknown) =>
  request('DELETE', path, { schema, body });

async function send(method: Method, path: string, body: unknown, signal?: AbortSignal): Promise<Response> {
  const headers: Record<string, string> = { accept: 'application/json' };
  if (body !== undefined) headers['content-type'] = 'application/json';
  try {
    return await fetch(path, {
      method,
      headers,
      credentials: 'same-origin',
      ...(body === undefined ? {} : { body: JSON.stringify(body) }),
      ...(signal ? { signal } : {}),
    });
  } catch (error) {
    if (signal?.aborted === true) throw error;
    throw offlineError();
  }
}

async function readAnswer<S extends z.ZodType>(response: Response, schema: S): Promise<z.output<S>> {
  const text = await response.text();
  const parsed = schema.safeParse(text === '' ? undefined : parseJson(text));
  if (parsed.success) return parsed.data;
  throw new ApiError('unreadable', 'The server answered with something this page cannot read.', {
    status: response.status,
    fields: parsed.error.issues.map((issue) => ({ path: issue.path.join('.'), message: issue.message })),
  });
}

/** Reads a refusal; a proxy's page or an empty body counts as the server out of order. */
export async function readError(response: Response): Promise<ApiError> {
  return errorFrom(response.status, await response.text(), response.headers.get('retry-after'));
}

export function errorFrom(status: number, text: string, retryAfter: string | null): ApiError {
  const parsed = errorBodySchema.safeParse(parseJson(text));
  const seconds = Number(retryAfter);
  const retryAfterSeconds = retryAfter !== null && Number.isFinite(seconds) ? seconds : null;
  if (!parsed.success) {
    if (status === 502 || status === 504) return offlineError();
    return new ApiError('failed', 'The server could not answer.', { status, retryAfterSeconds });
  }
  const { id, message, fields, current } = parsed.data.error;
  return new ApiError(id, message, { status, fields, current, retryAfterSeconds });
}

function parseJson(text: string): unknown {
  try {
    return JSON.parse(text) as unknown;
  } catch {
    return undefined;
  }
}
