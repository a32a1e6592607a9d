/** Two names that a reader would take for the same: case, spaces and the way letters were typed do not count. */
export function sameName(one: string, other: string): boolean {
  return plain(one) === plain(other);
}

/** The last column is always there and cannot be added a second time. */
export function isNoneOfThese(name: string): boolean {
  return plain(name) === 'none of these';
}

/** @source Unicode Standard Annex 15: NFKC, so that letters typed in different ways compare equal */
function plain(name: string): string {
  return name
    .normalize('NFKC')
    .replace(/[’‘ʼ`´]/g, "'")
    .replace(/[\p{Cf}\p{Cc}]/gu, '')
    .replace(/\s+/g, ' ')
    .trim()
    .toLowerCase();
}
