import { wellFormed } from '../search/well-formed.ts';
import { part } from './find-dom.ts';

/** Takes the words typed on the page of contents to the finder, whose address keeps them. */
const form = part('contents-find');
const field = part('contents-find-words') as HTMLInputElement;
const link = part('contents-find-link') as HTMLAnchorElement;

form.hidden = false;
form.addEventListener('submit', (event) => {
  event.preventDefault();
  const words = encodeURIComponent(wellFormed(field.value));
  location.assign(words === '' ? link.href : `${link.href}#words=${words}`);
});
