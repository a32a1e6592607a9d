import { pipeline } from 'node:stream/promises';
import type { Request, Response } from 'express';
import { byteRange } from './byte-range.js';
import { contentDisposition } from './file-name.js';
import type { ReadableReport } from './report-content.service.js';

/** Whatever a report holds, a browser must run nothing of it and send nothing on. */
const locked = "default-src 'none'; style-src 'unsafe-inline'; sandbox; frame-ancestors 'none'";

/** Sends a report, whole or the part that is asked for (200, 206, 416). */
export async function sendReport(
  report: ReadableReport,
  request: Request,
  response: Response,
): Promise<void> {
  const range = wantedRange(report, request);
  response.setHeader('Accept-Ranges', 'bytes');
  response.setHeader('Cache-Control', 'private, no-store');
  response.setHeader('Content-Security-Policy', locked);
  response.setHeader('X-Content-Type-Options', 'nosniff');
  if (range === 'unsatisfiable') {
    response
      .status(416)
      .setHeader('Content-Range', `bytes */${String(report.sizeBytes)}`)
      .end();
    return;
  }
  const content = request.method === 'HEAD' ? null : await report.open(range);
  const text = report.mediaType.startsWith('text/') ? '; charset=utf-8' : '';
  response.setHeader('Content-Type', report.mediaType + text);
  response.setHeader('Content-Disposition', contentDisposition(report.fileName));
  response.setHeader('ETag', `"${report.sha256}"`);
  if (range) {
    const { first, last } = range;
    response.status(206);
    response.setHeader('Content-Range', `bytes ${String(first)}-${String(last)}/${String(report.sizeBytes)}`);
    response.setHeader('Content-Length', last - first + 1);
  } else {
    response.status(200).setHeader('Content-Length', report.sizeBytes);
  }
  if (content) await pipeline(content, response).catch(() => content.destroy());
  else response.end();
}

/** With If-Range the part is only asked for where the content is still the same (RFC 9110 section 13.1.5). */
function wantedRange(report: ReadableReport, request: Request): ReturnType<typeof byteRange> {
  const condition = request.headers['if-range'];
  if (condition !== undefined && condition !== `"${report.sha256}"`) return null;
  return byteRange(request.headers.range, report.sizeBytes);
}
