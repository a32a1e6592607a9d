import { describe, expect, it } from 'vitest';
import { pageForKey, zoomed } from './zoom';

describe('reading by keyboard', () => {
  it('turns pages within the report', () => {
    expect(pageForKey('PageDown', 2, 3)).toBe(3);
    expect(pageForKey('ArrowRight', 3, 3)).toBe(3);
    expect(pageForKey('ArrowLeft', 1, 3)).toBe(1);
    expect(pageForKey('End', 1, 3)).toBe(3);
    expect(pageForKey('Home', 3, 3)).toBe(1);
    expect(pageForKey('a', 2, 3)).toBeNull();
  });

  it('stops at the ends of the zoom', () => {
    expect(zoomed(1, 1)).toBe(1.25);
    expect(zoomed(1, -1)).toBe(0.75);
    expect(zoomed(4, 1)).toBe(4);
    expect(zoomed(0.5, -1)).toBe(0.5);
  });
});
