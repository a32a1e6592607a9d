import { createHash } from 'node:crypto';
import { createWriteStream } from 'node:fs';
import path from 'node:path';
import type { Readable } from 'node:stream';
import { pipeline } from 'node:stream/promises';
import { reportSizeLimit } from '@weighhouse/shared/contracts/reports';
import type { Request, Response } from 'express';
import multer from 'multer';
import { invalid, Refusal } from '../platform/errors/refusal.js';
import { safeFileName } from './file-name.js';

/** A file that lies in a temporary folder. */
export interface ReceivedFile {
  path: string;
  /** Made safe. */
  fileName: string;
  /** The media type declared by whoever sent it. */
  declared: string;
  sizeBytes: number;
  /** SHA-256, hexadecimal. */
  sha256: string;
}

const oneFile = 'must be one file, in a multipart form';
const limits = { fileSize: reportSizeLimit, files: 1, fields: 8, fieldSize: 4096, parts: 9 };

/**
 * Reads the one file of a multipart request, field "file", into a folder, and digests it on the way. The folder is the
 * caller's to delete, whatever happens.
 * @throws Refusal 400 where there is not exactly one file, 413 beyond 25 MB
 */
export async function receiveUpload(
  request: Request,
  response: Response,
  directory: string,
): Promise<ReceivedFile> {
  const received: ReceivedFile[] = [];
  let name = '';
  const storage: multer.StorageEngine = {
    _handleFile(_, file, done) {
      name = safeFileName(file.originalname);
      const target = { path: path.join(directory, 'content'), fileName: name, declared: file.mimetype };
      writeDigested(file.stream, target.path).then(
        (digested) => {
          received.push({ ...target, ...digested });
          done(null, {});
        },
        (error: unknown) => done(error),
      );
    },
    _removeFile: (_, __, done) => done(null),
  };
  const upload = multer({ storage, limits, defParamCharset: 'utf8' }).single('file');
  await new Promise<void>((resolve, reject) => {
    upload(request, response, (error: unknown) =>
      error === undefined || error === null ? resolve() : reject(refusalFor(error, name)),
    );
  });
  const [file] = received;
  if (!file) throw invalid([{ path: 'file', message: oneFile }]);
  return file;
}

async function writeDigested(
  stream: Readable,
  target: string,
): Promise<{ sizeBytes: number; sha256: string }> {
  const hash = createHash('sha256');
  let sizeBytes = 0;
  const digest = async function* (source: AsyncIterable<Buffer>): AsyncGenerator<Buffer> {
    for await (const chunk of source) {
      hash.update(chunk);
      sizeBytes += chunk.length;
      yield chunk;
    }
  };
  await pipeline(stream, digest, createWriteStream(target, { mode: 0o600 }));
  return { sizeBytes, sha256: hash.digest('hex') };
}

function refusalFor(error: unknown, name: string): Refusal {
  const code = error instanceof multer.MulterError ? error.code : null;
  if (code === 'LIMIT_FILE_SIZE') {
    const words = `“${name}” is larger than 25 MB. Split it, or save the images at a lower resolution.`;
    return new Refusal('too-large', words);
  }
  if (code === 'LIMIT_FILE_COUNT' || code === 'LIMIT_UNEXPECTED_FILE') {
    return invalid([{ path: 'file', message: oneFile }]);
  }
  return new Refusal('malformed', 'The upload broke off or could not be read. Add the file again.');
}
