/** Where a formulary has no code yet. */
const FIRST = 'AA-001';

/** The code after the highest one of the prefix that most codes have, in the same number of digits. */
export function nextCode(codes: readonly string[]): string {
  const parsed = codes.flatMap((code) => {
    const [, prefix, digits] = /^([A-Z]{2,4})-(\d{1,4})[A-Z]?$/.exec(code) ?? [];
    return prefix && digits ? [{ prefix, digits }] : [];
  });
  const prefixes = Map.groupBy(parsed, ({ prefix }) => prefix);
  const [commonest] = [...prefixes].sort(([, a], [, b]) => b.length - a.length);
  if (!commonest) return FIRST;
  const [prefix, members] = commonest;
  const highest = Math.max(...members.map(({ digits }) => Number(digits)));
  const width = Math.max(...members.map(({ digits }) => digits.length));
  return `${prefix}-${String(highest + 1).padStart(width, '0')}`;
}
