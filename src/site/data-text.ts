/**
 * One text for each piece of plain data, with maps, sets, missing values and every number kept apart, which JSON alone
 * would not. Keys stay in the order they were made in.
 *
 * @throws Error for a function or anything else that is no data.
 */
export const dataText = (data: unknown): string => JSON.stringify(data, told);

/** Begins the only key of what stands for something that JSON does not know. */
const MARK = '\0';

function told(this: unknown, key: string, value: unknown): unknown {
  switch (typeof value) {
    case 'string':
    case 'boolean':
      return value;
    case 'number':
      return Number.isFinite(value) && !Object.is(value, -0) ? value : special('number', value);
    case 'undefined':
      return special('undefined', '');
    case 'object':
      if (value === null || Array.isArray(value)) return value;
      if (value instanceof Map) return { [`${MARK}map`]: [...value] };
      if (value instanceof Set) return { [`${MARK}set`]: [...value] };
      return plain(key, value);
    default:
      throw new Error(`${key} is a ${typeof value}, which is no data`);
  }
}

const special = (kind: string, value: unknown) => ({ [`${MARK}${kind}`]: String(value) });

function plain(key: string, value: object): object {
  const prototype = Object.getPrototypeOf(value);
  if (prototype !== Object.prototype && prototype !== null)
    throw new Error(`${key} is no plain data`);
  if (Object.keys(value).some((name) => name.startsWith(MARK))) {
    throw new Error(`${key} has a key that stands for something else`);
  }
  return value;
}
