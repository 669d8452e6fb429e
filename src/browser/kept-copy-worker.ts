import { answer } from './kept/answer.ts';
import type { Checked, Question } from './kept/copy.ts';
import { type HeldCopy, heldCopy } from './kept/storage.ts';
import { siteEdition, takeEdition } from './kept/take-edition.ts';
import type { WorkerScope } from './kept/worker-scope.ts';

// Keeps one edition of the handbook on this device and answers from it. It never changes to another by itself.
const worker = self as unknown as WorkerScope;
const { scope } = worker.registration;

let held: Promise<HeldCopy | null> | null = null;
const copy = () => {
  held ??= heldCopy(scope);
  return held;
};

worker.addEventListener('install', (event) => {
  event.waitUntil(
    copy().then(async (kept) => {
      if (!kept) await take(null);
      await worker.skipWaiting();
    }),
  );
});

worker.addEventListener('fetch', (event) => {
  const { request } = event;
  if (request.method !== 'GET' || !request.url.startsWith(scope)) return;
  event.respondWith(copy().then((kept) => (kept ? answer(request, scope, kept) : fetch(request))));
});

worker.addEventListener('message', (event) => {
  const [port] = event.ports;
  if (!port) return;
  const question = event.data as Question;
  const work = question === 'take' ? copy().then(take) : Promise.resolve();
  event.waitUntil(
    work.then(check).then(
      (state) => port.postMessage(state),
      () => port.postMessage(null),
    ),
  );
});

async function take(before: HeldCopy | null): Promise<void> {
  await takeEdition(scope, before, today());
  held = null;
}

async function check(): Promise<Checked> {
  const [kept, site] = await Promise.all([copy(), siteEdition(scope)]);
  return { held: kept && { edition: kept.edition, keptOn: kept.keptOn }, site };
}

/** By the clock of the device. */
function today(): string {
  const now = new Date();
  const two = (value: number) => String(value).padStart(2, '0');
  return `${now.getFullYear()}-${two(now.getMonth() + 1)}-${two(now.getDate())}`;
}
