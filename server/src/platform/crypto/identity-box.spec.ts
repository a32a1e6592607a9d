import { randomBytes } from 'node:crypto';
import { describe, expect, it } from 'vitest';
import { closeBox, openBox } from './identity-box.js';

const key = randomBytes(32);
const text = 'Rosalind Quickwater, 12 April 1985, 東京';

describe('the box around an identity card', () => {
  it('opens with its key, for what it belongs to', () => {
    expect(openBox(key, closeBox(key, text, 'case-1'), 'case-1')).toBe(text);
    expect(openBox(key, closeBox(key, '', 'case-1'), 'case-1')).toBe('');
  });

  it('is never the same twice and holds no word of the text', () => {
    const boxes = Array.from({ length: 50 }, () => closeBox(key, text, 'case-1'));
    expect(new Set(boxes.map((box) => box.subarray(0, 12).toString('hex'))).size).toBe(50);
    for (const box of boxes) expect(box.toString('latin1')).not.toContain('Rosalind');
  });

  it('does not open with another key, for another case, or after a change of any byte', () => {
    const box = closeBox(key, text, 'case-1');
    expect(() => openBox(randomBytes(32), box, 'case-1')).toThrow();
    expect(() => openBox(key, box, 'case-2')).toThrow();
    for (let at = 0; at < box.length; at += 1) {
      const changed = Buffer.from(box);
      changed[at] = (changed[at] ?? 0) ^ 1;
      expect(() => openBox(key, changed, 'case-1')).toThrow();
    }
  });

  it('does not open when it was cut short, not even where a short tag would still fit', () => {
    const box = closeBox(key, '', 'case-1');
    for (let length = 0; length < box.length; length += 1) {
      expect(() => openBox(key, box.subarray(0, length), 'case-1')).toThrow();
    }
  });
});
