import { describe, expect, it } from 'vitest';
import { held, moveInGrid, startsNumber } from './movement';

const size = { rows: 20, columns: 5 };
const from = { row: 3, column: 2 };
const move = (key: string, whole = false) => moveInGrid(from, key, whole, size);

describe('movement in the grid', () => {
  it('follows the arrow keys', () => {
    expect(move('ArrowUp')).toEqual({ row: 2, column: 2 });
    expect(move('ArrowDown')).toEqual({ row: 4, column: 2 });
    expect(move('ArrowLeft')).toEqual({ row: 3, column: 1 });
    expect(move('ArrowRight')).toEqual({ row: 3, column: 3 });
  });

  it('goes to the ends of the row, and with Control to the corners', () => {
    expect(move('Home')).toEqual({ row: 3, column: 0 });
    expect(move('End')).toEqual({ row: 3, column: 4 });
    expect(move('Home', true)).toEqual({ row: 0, column: 0 });
    expect(move('End', true)).toEqual({ row: 19, column: 4 });
  });

  it('stops at the edges', () => {
    expect(move('PageUp')).toEqual({ row: 0, column: 2 });
    expect(moveInGrid({ row: 19, column: 4 }, 'ArrowDown', false, size)).toEqual({ row: 19, column: 4 });
    expect(moveInGrid({ row: 0, column: 0 }, 'ArrowLeft', false, size)).toEqual({ row: 0, column: 0 });
  });

  it('leaves other keys alone', () => {
    expect(['Tab', 'a', 'Enter', '__proto__', 'constructor'].map((key) => move(key))).toEqual([
      null,
      null,
      null,
      null,
      null,
    ]);
  });

  it('comes back inside when rows or columns have gone', () => {
    expect(held({ row: 30, column: 9 }, size)).toEqual({ row: 19, column: 4 });
  });
});

it('begins a number with a digit only', () => {
  expect(['0', '7', 'a', 'F5', ' ', '-', '٣'].map(startsNumber)).toEqual([
    true,
    true,
    false,
    false,
    false,
    false,
    false,
  ]);
});
