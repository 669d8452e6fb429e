/** Path of the script that says what a page of the copy is, below the root. */
const notice = document.currentScript?.dataset.notice ?? '';
const { root = './', kept } = document.documentElement.dataset;
// a page from a disk has nothing to keep a copy of
if (location.protocol.startsWith('http') && navigator.serviceWorker) start(navigator.serviceWorker);

function start(workers: ServiceWorkerContainer): void {
  const manifest = document.createElement('link');
  manifest.rel = 'manifest';
  manifest.href = `${root}manifest.webmanifest`;
  document.head.append(manifest);
  // after the page itself: the copy takes the network for a while
  addEventListener('load', () => {
    workers
      .register(`${root}kept-copy-worker.js`, { updateViaCache: 'none' })
      // a browser that keeps nothing, or a site that is away: the page is read as it came
      .catch(() => undefined);
  });
  if (!kept) return;
  const script = document.createElement('script');
  script.src = `${root}${notice}`;
  document.head.append(script);
}
