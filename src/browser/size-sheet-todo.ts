import type { CorrectedLine } from '../chemistry/corrected-line.ts';
import { sizeSheetWords as text } from '../words/en/any-size.ts';
import { statedMass, weighed } from '../words/measures.ts';

/**
 * What to do about one line, in a sentence. `shown` tells whether its scale was read; a line that nothing was said of
 * may be there as written or not yet be weighed.
 */
export function todoText(
  { line, change, mixed, step }: CorrectedLine,
  { shown, dissolved }: { readonly shown: boolean; readonly dissolved: boolean },
): string {
  if (change === 0) return text.keep;
  const mass = statedMass(Math.abs(change));
  const inLye = dissolved && line.group === 'lye';
  const instead = sentence(
    change < 0,
    line.what === 'alkali',
    line.group === 'lye',
    dissolved,
  )(mass);
  if (shown || (mixed && inLye)) return instead;
  return text.notYet(weighed(line.mass, step), instead);
}

function sentence(takeBack: boolean, alkali: boolean, ofLye: boolean, dissolved: boolean) {
  // whoever forgot to say that the lye is made must not be told to pour water on it
  const beforeAlkali = ofLye && !alkali && !dissolved;
  if (takeBack) {
    if (beforeAlkali) return text.takeBackBeforeAlkali;
    return alkali ? text.takeBackAlkali : text.takeBack;
  }
  if (beforeAlkali) return text.addBeforeAlkali;
  if (!ofLye || !dissolved) return text.add;
  return alkali ? text.addAlkaliToLye : text.addLater;
}
