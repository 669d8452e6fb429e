import type { ReadYaml } from '../../reference/yaml.ts';
import type { Path, Report } from '../report.ts';

/** A number that reads the same to everybody: no exponent, no hexadecimal, no leading zero or plus. */
const PLAIN_NUMBER = /^-?(0|[1-9]\d*)(\.\d+)?$/;

/** Every number is written plainly: YAML would take `0x10` for 16 and `1e1` for 10. */
export function checkNumbers({ value, writtenAt }: ReadYaml, report: Report): void {
  visitNumbers(value, [], (path) => {
    const written = writtenAt(path) ?? '';
    if (!PLAIN_NUMBER.test(written)) {
      report.in(path, 'formula/number-form', {
        found: `"${written}"`,
        expected: 'a plain decimal number such as 45 or 2.5',
      });
    }
  });
}

function visitNumbers(value: unknown, path: Path, visit: (path: Path) => void): void {
  if (typeof value === 'number') visit(path);
  else if (Array.isArray(value)) {
    for (const [index, item] of value.entries()) visitNumbers(item, [...path, index], visit);
  } else if (typeof value === 'object' && value !== null) {
    for (const [key, item] of Object.entries(value)) visitNumbers(item, [...path, key], visit);
  }
}
