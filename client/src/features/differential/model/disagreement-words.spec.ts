import { expect, it } from 'vitest';
import { disagreementWords } from './disagreement-words';

it('says how far apart people are, against the most that is possible', () => {
  expect(disagreementWords(0, 4)).toBe(
    'The contributors are hardly apart: 0.00 of at most 2.0 bits of disagreement.',
  );
  expect(disagreementWords(0.1, 4)).toContain('a little apart');
  expect(disagreementWords(0.4, 4)).toContain('are apart');
  expect(disagreementWords(1.9, 4)).toContain('far apart');
});

it('does not speak of disagreement with one person', () => {
  expect(disagreementWords(0, 1)).toBe('One contributor: there is nobody to disagree with.');
});
