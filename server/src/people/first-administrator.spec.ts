import { describe, expect, it } from 'vitest';
import { codeFor } from './first-administrator.js';

describe('codeFor', () => {
  it.each([
    ['Quillhaven University Hospital', [], 'QUH'],
    ['Saltmarsh', [], 'SALTMA'],
    ['Clínica Ría de Vigo', [], 'CRDV'],
    ['a b c d e f g h', [], 'ABCDEF'],
    ['Quillhaven University Hospital', ['quh'], 'QUH2'],
    ['Quillhaven University Hospital', ['QUH', 'QUH2'], 'QUH3'],
    ['???', [], 'CENTRE'],
  ])('makes of %s beside %j %s', (name, taken, expected) => {
    expect(codeFor(name, taken)).toBe(expected);
  });
});
