import { shopAhead } from '../reference/shop-ahead-fs.ts';
import { speak } from '../words/catalogue.ts';

/** Has everything said in the language of a shop. A locale that cannot be spoken is a problem of its file, later. */
export function speakFor(data: string): void {
  const { locale } = shopAhead(data);
  if (locale === null) return;
  try {
    speak(locale);
  } catch (error) {
    if (!(error instanceof RangeError)) throw error;
  }
}
