const small = [
  'no',
  'one',
  'two',
  'three',
  'four',
  'five',
  'six',
  'seven',
  'eight',
  'nine',
  'ten',
  'eleven',
  'twelve',
];

/** Whole numbers up to twelve in words, larger ones in figures. */
export function numberWord(count: number): string {
  return small[count] ?? String(count);
}

/** "1 row", "9 rows". */
export function counted(count: number, one: string, many = `${one}s`): string {
  return `${String(count)} ${count === 1 ? one : many}`;
}

/** "A", "A and B", "A, B and C". */
export function listed(items: readonly string[]): string {
  if (items.length < 2) return items[0] ?? '';
  return `${items.slice(0, -1).join(', ')} and ${items.at(-1) ?? ''}`;
}

export function capital(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}

/** How long to wait, rounded up: "20 seconds", "2 minutes". */
export function waitWords(seconds: number): string {
  if (seconds < 90) return counted(Math.max(1, Math.ceil(seconds)), 'second');
  return counted(Math.ceil(seconds / 60), 'minute');
}

/** "900 B", "14 kB", "2.4 MB"; a megabyte is 1024 × 1024 bytes, as the upload limit counts. */
export function sizeWords(bytes: number): string {
  if (bytes < 1000) return `${String(bytes)} B`;
  if (bytes < 1024 * 1000) return `${String(Math.max(1, Math.round(bytes / 1024)))} kB`;
  return `${(bytes / 1024 / 1024).toFixed(1)} MB`;
}
