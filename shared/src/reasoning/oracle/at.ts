/** The entry of a list; an index outside it is a mistake of the engine, not of the panel. */
export function at<Entry>(list: readonly Entry[], index: number): Entry {
  const entry = list[index];
  if (entry === undefined) throw new RangeError(`no entry ${index} in a list of ${list.length}`);
  return entry;
}

export function sum(numbers: readonly number[]): number {
  return numbers.reduce((total, number) => total + number, 0);
}

/** The numbers divided by their sum. */
export function normalised(numbers: readonly number[]): number[] {
  const total = sum(numbers);
  return numbers.map((number) => number / total);
}

/** 0, 1, … length - 1. */
export function upTo(length: number): number[] {
  return Array.from({ length }, (_, index) => index);
}
