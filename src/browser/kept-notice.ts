import './speak.ts';
import { keptCopy as text } from '../words/en/kept-copy.ts';
import { part } from './find-dom.ts';
import type { Checked, Question } from './kept/copy.ts';

// Loaded only in pages that come from the copy on a device, and from there: other pages stay light.
const { kept } = document.documentElement.dataset;
const button = part('kept-take') as HTMLButtonElement;
button.addEventListener('click', () => take(navigator.serviceWorker, button));
addEventListener('online', look);
document.addEventListener('visibilitychange', () => {
  if (document.visibilityState === 'visible') look();
});
look();

function look(): Promise<void> {
  return ask(navigator.serviceWorker, 'check').then(show);
}

function ask(workers: ServiceWorkerContainer, question: Question): Promise<Checked | null> {
  const { controller } = workers;
  if (!controller) return Promise.resolve(null);
  return new Promise((resolve) => {
    const { port1, port2 } = new MessageChannel();
    port1.onmessage = ({ data }) => resolve(data as Checked | null);
    controller.postMessage(question, [port2]);
  });
}

async function take(workers: ServiceWorkerContainer, button: HTMLButtonElement): Promise<void> {
  button.disabled = true;
  part('kept-text').textContent = text.taking;
  const state = await ask(workers, 'take');
  if (state) location.reload();
  else say('other', text.notTaken);
  button.disabled = false;
}

type Standing = 'current' | 'unchecked' | 'other';

function show(state: Checked | null): void {
  say(...noticeOf(state));
}

function noticeOf(state: Checked | null): readonly [Standing, string] {
  const held = state?.held;
  if (!state || !held) return ['unchecked', text.unknown];
  const { edition, keptOn } = held;
  if (edition.content !== kept) return ['other', text.replaced];
  const { site } = state;
  if (!site) return ['unchecked', text.unchecked(edition.id, edition.asOf, keptOn)];
  if (site.content === edition.content) return ['current', text.current(edition.id, keptOn)];
  return site.id === edition.id
    ? ['other', text.rebuilt(edition.id, edition.asOf, keptOn)]
    : ['other', text.other(edition.id, edition.asOf, keptOn, site.id, site.asOf)];
}

function say(state: Standing, words: string): void {
  const notice = part('kept-copy');
  notice.dataset.state = state;
  part('kept-text').textContent = words;
  part('kept-take').hidden = state !== 'other';
}
