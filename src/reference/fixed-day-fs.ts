import { readText } from './read-text-fs.ts';
import { parseYaml } from './yaml.ts';

/** The day that an invented shop's `shop.yaml` fixes, or `null`; the schema sees to the rest of the file. */
export function fixedDay(dataFolder: string): string | null {
  const read = readText(`${dataFolder.replace(/[/\\]+$/, '')}/shop.yaml`);
  if (!read.ok) return null;
  const shop = parseYaml(read.text).value as { readonly 'as-of'?: unknown } | null;
  return typeof shop?.['as-of'] === 'string' ? shop['as-of'] : null;
}
