import './speak.ts';
import type { Sized } from '../chemistry/any-size.ts';
import { sizeSheetWords as text } from '../words/en/any-size.ts';
import { stepText } from '../words/measures.ts';
import { type Asked, askForSize, withData } from './any-size-ask.ts';
import type { AnySizeData } from './any-size-data.ts';
import { shownGroups, stepsOf } from './any-size-lines.ts';
import { notes } from './any-size-notes.ts';
import { weightsTable } from './any-size-weights.ts';
import { element, part } from './find-dom.ts';
import { correctionForm } from './size-sheet-correction.ts';

/** A listed size is made from its own sheet, unless it had to be put right; a stopped one has none. */
function mark(listed: boolean, stopped = false): void {
  const { classList } = document.documentElement;
  classList.toggle('is-listed', listed);
  classList.toggle('is-stopped', stopped);
}

function put(sized: Sized | null, name: string, data: AnySizeData): void {
  part('any-size-weights').replaceChildren(
    ...(sized ? [weightsTable(sized, data, name, 'sheet')] : []),
  );
  part('any-size-notes').replaceChildren(
    ...(sized ? notes(sized, data).map((note) => element('p', {}, note)) : []),
  );
  for (const place of document.querySelectorAll('.any-size-name')) place.textContent = name;
  part('any-size-scales').textContent = sized && text.sheetScales(scalesOf(sized, data));
}

/** `steps of 0.1 g; steps of 1 g` */
const scalesOf = ({ weighed }: Sized, data: AnySizeData): string =>
  stepsOf(shownGroups(weighed, data))
    .map((step) => text.scale(stepText(step)))
    .join('; ');

withData((data) => {
  let asked: Asked | null = null;
  const ask = correctionForm(data, (sized, state) => {
    const name = asked?.name ?? '';
    put(sized, state === 'corrected' ? text.corrected(name) : name, data);
    mark(state === 'asked' && asked?.listed === true, state === 'stopped');
  });
  askForSize(data, (size) => {
    asked = size;
    put(size.sized, size.name, data);
    mark(size.listed);
    ask(size.sized);
  });
});
