const vowel = 'aeiouyäöü';

/**
 * Lets long words break in narrow columns: a soft hyphen before each consonant that stands between vowels, which is
 * where syllables of medical words mostly begin ("Disse-mi-na-ted"). From memory, no dictionary; a wrong place only
 * looks odd.
 */
export function withSoftHyphens(name: string): string {
  return name.replace(/\p{L}{10,}/gu, hyphenated);
}

function hyphenated(word: string): string {
  const isVowel = (index: number) => vowel.includes((word[index] ?? '').toLowerCase());
  let out = '';
  for (let index = 0; index < word.length; index += 1) {
    const syllable = isVowel(index - 1) && !isVowel(index) && isVowel(index + 1);
    if (syllable && index >= 3 && word.length - index >= 3) out += '\u00ad';
    out += word[index] ?? '';
  }
  return out;
}
