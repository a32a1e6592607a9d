/** First and last byte of a part of a file, both included. */
export interface ByteRange {
  first: number;
  last: number;
}

/**
 * Which part of a file is asked for.
 * @param header the Range header
 * @param size bytes of the whole file, 1 or more
 * @returns null for the whole file, also where the header is malformed or asks for several parts, which a server may
 *   answer in full; `unsatisfiable` where no byte of the file is asked for
 * @source RFC 9110 section 14.2
 */
export function byteRange(header: string | undefined, size: number): ByteRange | null | 'unsatisfiable' {
  const match = /^bytes=(\d*)-(\d*)$/.exec(header?.trim() ?? '');
  if (!match) return null;
  const [, from = '', to = ''] = match;
  if (from === '' && to === '') return null;
  if (from === '') {
    const length = Number(to);
    return length === 0 ? 'unsatisfiable' : { first: Math.max(0, size - length), last: size - 1 };
  }
  const first = Number(from);
  const last = to === '' ? size - 1 : Math.min(Number(to), size - 1);
  if (to !== '' && Number(to) < first) return null;
  return first >= size ? 'unsatisfiable' : { first, last };
}
