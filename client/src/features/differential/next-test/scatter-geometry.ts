/** What a test takes (days or money; null where nobody said) and what it settles. */
export interface Dot {
  id: string;
  takes: number | null;
  settles: number;
}

/**
 * Round steps for an axis from 0: 1, 2 or 5 times a power of ten, and at most `most` steps up to the first that covers
 * the value.
 * @example axisSteps(13, 5) // [0, 5, 10, 15]
 */
export function axisSteps(largest: number, most: number): number[] {
  if (!(largest > 0)) return [0, 1];
  const power = 10 ** Math.floor(Math.log10(largest / most));
  const step = [1, 2, 5, 10].map((times) => times * power).find((size) => size * most >= largest) ?? largest;
  const count = Math.ceil(largest / step - 1e-9);
  return Array.from({ length: count + 1 }, (_, index) => Number((index * step).toPrecision(12)));
}

/**
 * The most that one test settles within what it takes, as the corners of a stair: at each of them nothing that takes
 * as little settles more. Tests of which nobody said what they take are left out.
 */
export function stair(dots: readonly Dot[]): { takes: number; settles: number }[] {
  const known = dots.flatMap(({ takes, settles }) => (takes === null ? [] : [{ takes, settles }]));
  const corners: { takes: number; settles: number }[] = [];
  for (const dot of known.toSorted((one, other) => one.takes - other.takes || other.settles - one.settles))
    if (dot.settles > (corners.at(-1)?.settles ?? -1)) corners.push(dot);
  return corners;
}

/** A place on the drawing, in pixels. */
export interface Spot {
  x: number;
  y: number;
}

const sides: readonly Spot[] = [
  { x: 13, y: 4 },
  { x: -13, y: 4 },
  { x: 0, y: -10 },
  { x: 0, y: 18 },
  { x: 13, y: -9 },
  { x: -13, y: -9 },
  { x: 13, y: 17 },
  { x: -13, y: 17 },
];

/** Where the number of each dot stands: beside it, where no other dot and no other number is, if there is such a side. */
export function labelSpots(dots: readonly Spot[]): Spot[] {
  const taken: Spot[] = [...dots];
  return dots.map((dot) => {
    const free = sides
      .map((side) => ({ x: dot.x + side.x, y: dot.y + side.y }))
      .find((spot) => taken.every((other) => other === dot || !near(spot, other)));
    const spot = free ?? { x: dot.x + 13, y: dot.y + 4 };
    taken.push(middleOf(spot));
    return spot;
  });
}

/** A number is drawn from its foot, so its middle lies above it. */
const middleOf = ({ x, y }: Spot): Spot => ({ x, y: y - 4 });
const near = (number: Spot, other: Spot) =>
  Math.abs(number.x - other.x) < 13 && Math.abs(middleOf(number).y - other.y) < 11;
