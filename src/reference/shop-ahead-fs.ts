import { readText } from './read-text-fs.ts';
import { parseYaml } from './yaml.ts';

/** The settings of a shop that must be known before anything is read, as written; the schema checks them later. */
export interface ShopAhead {
  /** The day that an invented shop fixes. */
  readonly asOf: string | null;
  /** BCP 47 tag. */
  readonly locale: string | null;
  /** `metric` or `us`. */
  readonly weights: string | null;
}

/** From `shop.yaml` of a data folder; a setting that is absent, or in a broken file, is `null`. */
export function shopAhead(dataFolder: string): ShopAhead {
  const read = readText(`${dataFolder.replace(/[/\\]+$/, '')}/shop.yaml`);
  const shop = read.ok ? parseYaml(read.text).value : null;
  const setting = (key: string): string | null => {
    const value = (shop as Readonly<Record<string, unknown>> | null)?.[key];
    return typeof value === 'string' ? value : null;
  };
  return { asOf: setting('as-of'), locale: setting('locale'), weights: setting('weights') };
}
