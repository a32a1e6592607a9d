/**
 * An object keyed by ids that come from outside. It has no prototype, so an id
 * such as `__proto__` becomes an ordinary key that JSON.stringify prints.
 *
 * @example keyed([['__proto__', 1]]) // { ['__proto__']: 1 }
 */
export function keyed<Value>(entries: Iterable<readonly [string, Value]>): Record<string, Value> {
  const object = Object.create(null) as Record<string, Value>;
  for (const [id, value] of entries) object[id] = value;
  return object;
}
