const longest = 120;
const longestRead = 1000;

/** Controls, joiners and direction marks: what makes a name read otherwise than it is (Unicode Cc, Cf, Cs, Zl, Zp). */
const invisible = /[\p{Cc}\p{Cf}\p{Cs}\p{Zl}\p{Zp}\uFFFD]/gu;

/**
 * A file's name as it can be kept, shown and sent: without folders, quotes, control and direction marks, and at most
 * 120 characters with its ending.
 * @example safeFileName('../../a"b.pdf') is "ab.pdf"
 */
export function safeFileName(name: string): string {
  // Its end holds the ending; names of thousands of dots would take seconds to trim.
  const last = (name.split(/[/\\]/).at(-1) ?? '').slice(-longestRead);
  const plain = last
    .normalize('NFC')
    .replace(invisible, '')
    .replace(/["'`<>|:*?;]/g, '')
    .replace(/\s+/g, ' ')
    .trim();
  const ending = endingOf(plain);
  const stem = plain.slice(0, plain.length - ending.length).replace(/^[. ]+|[. ]+$/g, '');
  const kept = Array.from(stem)
    .slice(0, longest - ending.length)
    .join('');
  return kept === '' ? `report${ending}` : kept + ending;
}

/** The ending with its dot, in lower case; empty where there is none. */
export function endingOf(name: string): string {
  return /\.[a-z0-9]{1,8}$/i.exec(name)?.[0].toLowerCase() ?? '';
}

/**
 * The header that names a file, for every browser.
 * @source RFC 6266 section 4 and RFC 8187 section 3.2
 */
export function contentDisposition(name: string): string {
  const ascii = name.replace(/[^\x20-\x7e]/g, '_').replace(/["\\%]/g, '_');
  const encoded = encodeURIComponent(name).replace(
    /[!'()*]/g,
    (sign) => `%${sign.charCodeAt(0).toString(16).toUpperCase()}`,
  );
  return `inline; filename="${ascii}"; filename*=UTF-8''${encoded}`;
}
