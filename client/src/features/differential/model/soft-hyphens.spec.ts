import { expect, it } from 'vitest';
import { withSoftHyphens } from './soft-hyphens';

const shown = (name: string) => withSoftHyphens(name).replaceAll('\u00ad', '-');

it('lets long words break between syllables, and leaves short ones whole', () => {
  expect(shown('Disseminated tuberculosis')).toBe('Dis-se-mi-na-ted tuber-cu-lo-sis');
  expect(shown('Systemic lupus erythematosus')).toBe('Systemic lupus ery-the-ma-to-sus');
  expect(shown('Hypertensive heart disease')).toBe('Hyper-ten-sive heart disease');
  expect(shown('Hypertrophic cardiomyopathy')).toBe('Hyper-tro-phic car-dio-myo-pa-thy');
  expect(shown('Constrictive pericarditis')).toBe('Con-stric-tive peri-car-di-tis');
  expect(shown('Adult-onset Still’s disease')).toBe('Adult-onset Still’s disease');
});

it('changes no letter', () => {
  const name = 'Hämophagozytische Lymphohistiozytose (EBV)';
  expect(withSoftHyphens(name).replaceAll('\u00ad', '')).toBe(name);
});
