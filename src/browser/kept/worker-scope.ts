/** What this project uses of a service worker's global scope; the types of pages do not have it. */
export interface WorkerScope {
  readonly registration: { readonly scope: string };
  skipWaiting(): Promise<void>;
  addEventListener(
    type: 'install',
    listener: (event: { waitUntil(work: Promise<unknown>): void }) => void,
  ): void;
  addEventListener(
    type: 'fetch',
    listener: (event: {
      readonly request: Request;
      respondWith(answer: Promise<Response>): void;
    }) => void,
  ): void;
  addEventListener(
    type: 'message',
    listener: (event: {
      readonly data: unknown;
      readonly ports: readonly MessagePort[];
      waitUntil(work: Promise<unknown>): void;
    }) => void,
  ): void;
}
