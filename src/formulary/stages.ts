/** The stages of a build, in their order. */
export type Stage =
  | 'read'
  | 'compute'
  | 'edition'
  | 'pages'
  | 'cards'
  | 'document'
  | 'links'
  | 'search'
  | 'checksums';

const PREFIX = 'handbook: ';

/** Notes how long a stage took, from `start` (`performance.now()`) until now, for whoever asks `onStage`. */
export function measureStage(stage: Stage, start: number): void {
  performance.measure(PREFIX + stage, { start });
}

/** Hears of each stage when it is over; how long it took in milliseconds. */
export function onStage(told: (stage: Stage, milliseconds: number) => void): void {
  new PerformanceObserver((list) => {
    for (const { name, duration } of list.getEntries())
      if (name.startsWith(PREFIX)) told(name.slice(PREFIX.length) as Stage, duration);
  }).observe({ entryTypes: ['measure'] });
}
