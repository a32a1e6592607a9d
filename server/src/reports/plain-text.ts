import { createReadStream } from 'node:fs';

/** Control bytes that no text holds; tab, line feed, form feed and carriage return are text. */
// eslint-disable-next-line no-control-regex -- control characters are what is looked for
const control = /[\u0000-\u0008\u000b\u000e-\u001f\u007f]/;

/** Whether a file is text in UTF-8 from its first to its last byte. */
export async function isPlainText(path: string): Promise<boolean> {
  const decoder = new TextDecoder('utf-8', { fatal: true });
  const stream = createReadStream(path);
  try {
    for await (const chunk of stream) {
      if (control.test(decoder.decode(chunk as Buffer, { stream: true }))) return false;
    }
    decoder.decode();
    return true;
  } catch (error) {
    if (error instanceof TypeError) return false;
    throw error;
  } finally {
    stream.destroy();
  }
}
