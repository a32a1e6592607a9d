const longWords = /\p{L}{10,}/gu;
/** Vowels, then consonants, then a vowel: where one syllable ends and the next begins. */
const between = /(?<=[aeiouyäöü])([^aeiouyäöü]+)(?=[aeiouyäöü])/gi;
/** Consonants that begin a syllable together: "hyper-tro-phic", not "hypert-rop-hic". */
const together = /(?:[bcfgp]l|s?[ptk]r|[bcdfg]r|ch|ck|gh|ph|sh|th|wh|qu)$/i;

/**
 * Lets long words break in narrow columns: a soft hyphen before the consonants that begin a syllable, which is where
 * medical words mostly break ("Disse-mi-na-ted", "Hyper-ten-sive"). From memory, no dictionary; a wrong place only
 * looks odd.
 */
export function withSoftHyphens(name: string): string {
  return name.replace(longWords, hyphenated);
}

function hyphenated(word: string): string {
  return word.replace(between, (consonants: string, _all: string, start: number) => {
    const onset = together.exec(consonants)?.[0].length ?? 1;
    const at = start + consonants.length - onset;
    if (at < 3 || word.length - at < 3) return consonants;
    return `${consonants.slice(0, consonants.length - onset)}\u00ad${consonants.slice(consonants.length - onset)}`;
  });
}
