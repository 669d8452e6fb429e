/** Plain data that has one canonical text. An absent key and `undefined` are the same. */
export type Canonical =
  | string
  | number
  | boolean
  | null
  | readonly Canonical[]
  | { readonly [key: string]: Canonical | undefined };

/**
 * The one JSON text of some data by the JSON Canonicalization Scheme (RFC 8785): no spaces, keys sorted by
 * UTF-16 code unit, numbers and strings as ECMAScript writes them.
 *
 * @throws RangeError for a number that is not finite.
 */
export function canonicalText(value: Canonical): string {
  if (typeof value === 'number' && !Number.isFinite(value)) {
    throw new RangeError(`${value} has no canonical text`);
  }
  if (typeof value !== 'object' || value === null) return JSON.stringify(value);
  if (isList(value)) return `[${value.map(canonicalText).join(',')}]`;
  const members = Object.keys(value)
    .sort()
    .flatMap((key) => {
      const member = value[key];
      return member === undefined ? [] : `${JSON.stringify(key)}:${canonicalText(member)}`;
    });
  return `{${members.join(',')}}`;
}

const isList = (value: object): value is readonly Canonical[] => Array.isArray(value);
