import { describe, expect, it } from 'vitest';
import { counted, listed, numberWord, sizeWords, waitWords } from './words';

describe('words', () => {
  it('counts', () => {
    expect(numberWord(4)).toBe('four');
    expect(numberWord(13)).toBe('13');
    expect(counted(1, 'row')).toBe('1 row');
    expect(counted(9, 'row')).toBe('9 rows');
  });

  it('lists', () => {
    expect(listed([])).toBe('');
    expect(listed(['A'])).toBe('A');
    expect(listed(['A', 'B', 'C'])).toBe('A, B and C');
  });

  it('rounds waits up, so that nobody comes back too early', () => {
    expect(waitWords(0.2)).toBe('1 second');
    expect(waitWords(61)).toBe('61 seconds');
    expect(waitWords(121)).toBe('3 minutes');
  });

  it('shows sizes as the upload limit counts them', () => {
    expect(sizeWords(0)).toBe('0 B');
    expect(sizeWords(14_000)).toBe('14 kB');
    expect(sizeWords(25 * 1024 * 1024)).toBe('25.0 MB');
  });
});
