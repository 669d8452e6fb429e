import { shopAhead } from '../reference/shop-ahead-fs.ts';
import { speak } from '../words/catalogue.ts';
import { UNIT_SYSTEMS } from '../words/units.ts';
import { voice } from '../words/voice.ts';

/**
 * Has everything said in the language and the units of a shop. A locale or units that are not known are a problem of
 * its file, later.
 */
export function speakFor(data: string): void {
  const { locale, weights } = shopAhead(data);
  const units = UNIT_SYSTEMS.find((known) => known === weights);
  try {
    speak(locale ?? voice().locale, units);
  } catch (error) {
    if (!(error instanceof RangeError)) throw error;
  }
}
