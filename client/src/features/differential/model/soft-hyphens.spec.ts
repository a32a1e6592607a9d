import { expect, it } from 'vitest';
import { withSoftHyphens } from './soft-hyphens';

const shown = (name: string) => withSoftHyphens(name).replaceAll('\u00ad', '-');

it('lets long words break between syllables, and leaves short ones whole', () => {
  expect(shown('Disseminated tuberculosis')).toBe('Disse-mi-na-ted tubercu-lo-sis');
  expect(shown('Systemic lupus erythematosus')).toBe('Systemic lupus erythe-ma-to-sus');
  expect(shown('Adult-onset Still’s disease')).toBe('Adult-onset Still’s disease');
});

it('changes no letter', () => {
  const name = 'Hämophagozytische Lymphohistiozytose (EBV)';
  expect(withSoftHyphens(name).replaceAll('\u00ad', '')).toBe(name);
});
