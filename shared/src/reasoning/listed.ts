/** Numbers as an ordinary list, which is what JSON and comparison expect. */
export function listed(values: Float64Array, from = 0, to = values.length): number[] {
  const list = new Array<number>(to - from);
  for (let index = from; index < to; index += 1) list[index - from] = values[index]!;
  return list;
}
