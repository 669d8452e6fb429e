import type { Sized } from '../chemistry/any-size.ts';
import type { AtTheBench, Shown } from '../chemistry/correction.ts';
import { grams } from '../chemistry/quantity.ts';
import { anySizeWords, sizeSheetWords as text } from '../words/en/any-size.ts';
import { massUnit, stepText, weighed } from '../words/measures.ts';
import { voice } from '../words/voice.ts';
import type { AnySizeData } from './any-size-data.ts';
import { type ShownLine, shownGroups } from './any-size-lines.ts';
import { typedMass } from './any-size-typed.ts';
import { element, part } from './find-dom.ts';

/** What was typed of the bench, or a sentence for the first field that cannot be read. */
export type BenchRead =
  | { readonly ok: true; readonly bench: AtTheBench }
  | { readonly ok: false; readonly sentence: string };

/** Lines that are on the scale before lye and fats meet; what joins after the cook or at dilution is weighed later. */
const EARLY: readonly string[] = ['lye', 'fats', 'trace'];

/** Fields for what the scale showed of each line of a size. */
export function benchFields(sized: Sized, data: AnySizeData): { readonly read: () => BenchRead } {
  const lines = shownGroups(sized.weighed, data)
    .flatMap((group) => group.lines)
    .filter(({ group }) => EARLY.includes(group));
  const rows = lines.map(fieldsOf);
  part('correction-lines').replaceChildren(...rows.map(({ row }) => row));
  const ticked = (id: string) => (part(id) as HTMLInputElement).checked;

  return {
    read: () => {
      const shown = new Map<number, Shown>();
      const dissolved = ticked('correction-dissolved');
      const combined = ticked('correction-combined');
      for (const { line, row, field, mixed } of rows) {
        // in a made lye everything is in with the rest
        row.classList.toggle('in-made-lye', dissolved && line.group === 'lye');
        if (field.value.trim() === '') continue;
        const reading = readingOf(field.value, line);
        if (typeof reading === 'string') {
          // what has met stays stopped, whatever else is typed
          if (combined) continue;
          return { ok: false, sentence: reading };
        }
        shown.set(line.place, { mass: grams(reading), mixed: mixed?.checked ?? false });
      }
      return { ok: true, bench: { combined, dissolved, shown } };
    },
  };
}

/** Grams, or a sentence why it is no reading of this scale. */
function readingOf(typed: string, { name, step }: ShownLine): number | string {
  // nothing on the scale is a reading too
  if (/^(?:0+\s*lb\s*)?0+(?:[.,]0+)?\s*(?:g|oz)?$/u.test(typed.trim())) return 0;
  const mass = typedMass(typed, voice());
  if (!mass.ok) {
    const sentence = anySizeWords.typed[mass.fault];
    const said = typeof sentence === 'string' ? sentence : sentence(voice().decimalSign);
    return text.faulty(name, said);
  }
  const steps = mass.value / step;
  if (Math.abs(steps - Math.round(steps)) > 1e-6) return text.offStep(name, stepText(step));
  // to the digits that weights are kept to, so that what is right is right to the last bit
  return Number((Math.round(steps) * step).toPrecision(12));
}

function fieldsOf(line: ShownLine) {
  const { name, line: weighing, step } = line;
  const id = `shown-${line.place}`;
  const field = element('input', {
    id,
    type: 'text',
    inputmode: 'decimal',
    maxlength: '12',
    placeholder: massUnit(),
    autocomplete: 'off',
    'aria-label': text.shown(name, massUnit()),
  });
  // solid alkali stands alone until it is in the water
  const mixed =
    weighing.what === 'alkali'
      ? null
      : element('input', { type: 'checkbox', 'aria-label': text.mixedOf(name) });
  const row = element(
    'div',
    { class: 'correction-line' },
    element('label', { for: id }, element('b', {}, name), ` ${weighed(weighing.mass, step)}`),
    field,
    mixed && element('label', { class: 'mixed' }, mixed, ` ${text.mixed}`),
  );
  return { line, row, field, mixed };
}
