import { wellFormed } from '../search/well-formed.ts';
import type { Wish } from './any-size-wanted.ts';
import { inputs, part } from './find-dom.ts';

/** The fields of the form; one of them holds the wish, the others are empty. */
export interface WishFields {
  /** The field's wish, or else what the address asks for; `null` where neither does. */
  readonly wish: () => Wish | null;
  readonly onChange: (draw: () => void) => void;
}

/** The form by which a size is asked for. What is typed stands in the address, so that a page can be kept. */
export function wishFields(): WishFields {
  const form = part('any-size-form');
  const fields = inputs(form, 'way');
  const wayOf = (field: HTMLInputElement) => field.dataset.way ?? '';

  const typed = (): Wish | null => {
    const field = fields.find(({ value }) => value !== '');
    return field ? { way: wayOf(field), text: field.value } : null;
  };
  const show = (wish: Wish | null) => {
    for (const field of fields) field.value = wish?.way === wayOf(field) ? wish.text : '';
  };
  const keep = (wish: Wish | null) => {
    const hash = wish && `#${wish.way}=${encodeURIComponent(wellFormed(wish.text))}`;
    history.replaceState(null, '', hash ?? location.pathname + location.search);
  };
  show(addressWish());

  return {
    wish: () => typed() ?? addressWish(),
    onChange: (draw) => {
      form.addEventListener('input', ({ target }) => {
        // the last one typed in counts
        for (const field of fields) if (field !== target) field.value = '';
        keep(typed());
        draw();
      });
      form.addEventListener('submit', (event) => event.preventDefault());
      part('any-size-clear').addEventListener('click', () => {
        show(null);
        keep(null);
        draw();
        fields[0]?.focus();
      });
      addEventListener('hashchange', () => {
        show(addressWish());
        draw();
      });
    },
  };
}

/** `#fats=1250`; what does not read so is no wish. */
function addressWish(): Wish | null {
  const [, way, encoded] = /^#(fats|batter|bars-\d|listed)=(.*)$/.exec(location.hash) ?? [];
  if (way === undefined || encoded === undefined) return null;
  try {
    return { way, text: decodeURIComponent(encoded) };
  } catch {
    return null;
  }
}
