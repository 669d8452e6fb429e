import './speak.ts';
import { checkSheet, type SheetList, type SheetState } from '../edition/check-sheet.ts';
import { checkPage as text } from '../words/en/check-page.ts';
import { part } from './find-dom.ts';

declare global {
  /** Set by the data script of the page that checks sheets. */
  var handbookSheets: SheetList | undefined;
}

if (globalThis.handbookSheets) start(globalThis.handbookSheets);
else part('check-off').textContent = text.broken;

function start(list: SheetList): void {
  const form = part('check-form');
  part('check-off').hidden = true;
  form.hidden = false;
  form.addEventListener('submit', (event) => {
    event.preventDefault();
    const [code, digest] = ['check-code', 'check-digest'].map(
      (id) => (part(id) as HTMLInputElement).value,
    );
    const answer = part('check-answer');
    if (!code?.trim() || !digest?.trim()) {
      answer.dataset.state = 'missing';
      answer.textContent = text.missing;
      return;
    }
    const state = checkSheet(code, digest, list);
    answer.dataset.state = state.state;
    answer.textContent = answerText(state);
  });
}

function answerText(state: SheetState): string {
  switch (state.state) {
    case 'current':
      return text.current(state.code, state.revision);
    case 'superseded':
      if (state.by === null) return text.left(state.code, state.revision, state.on);
      return state.by === state.revision
        ? text.reweighed(state.code, state.revision, state.on)
        : text.superseded(state.code, state.revision, state.by, state.on);
    case 'withdrawn':
      return text.withdrawn(state.code, state.on);
    case 'unknown':
      return text.unknown;
    case 'mistyped':
      return state.part === 'digest' ? text.mistypedDigest : text.mistypedCode;
  }
}
