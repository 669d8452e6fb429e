import './speak.ts';
import { wellFormed } from '../search/well-formed.ts';
import { askForSize, withData } from './any-size-ask.ts';
import { notes } from './any-size-notes.ts';
import { weightsTable } from './any-size-weights.ts';
import { element, part } from './find-dom.ts';

withData((data) => {
  askForSize(data, ({ sized, name, wish }) => {
    part('any-size-weights').replaceChildren(
      ...(sized ? [weightsTable(sized, data, name, 'block')] : []),
    );
    part('any-size-notes').replaceChildren(
      ...(sized ? notes(sized, data).map((note) => element('p', {}, note)) : []),
    );
    // the size goes along to the sheet
    const link = part('any-size-link') as HTMLAnchorElement;
    link.hash = wish ? `${wish.way}=${encodeURIComponent(wellFormed(wish.text))}` : '';
  });
});
