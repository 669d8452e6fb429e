/**
 * One built page of the demo for every page file: what holds for each kind is looked at on it. The demo has withdrawn
 * no formula; the page of one is a head with a notice, both of which other kinds have.
 */
export const PAGE_KINDS: Readonly<Record<string, string | null>> = {
  '404.astro': '404.html',
  'changes.astro': 'changes.html',
  'check.astro': 'check.html',
  'contradictions.astro': 'contradictions.html',
  'evidence.astro': 'evidence.html',
  'fats/[id].astro': 'fats/olive.html',
  'fats/index.astro': 'fats/index.html',
  'find.astro': 'find.html',
  'formulas/[code].astro': 'formulas/QY-018.html',
  'formulas/[withdrawn].astro': null,
  'index.astro': 'index.html',
  'lists/[list].astro': 'lists/cautions.html',
  'lots.astro': 'lots.html',
  'lye/[batch].astro': 'lye/pilot.html',
  'lye/fats.astro': 'lye/fats.html',
  'materials/[id].astro': 'materials/goat-milk.html',
  'materials/index.astro': 'materials/index.html',
  'methods.astro': 'methods.html',
  'not-kept.astro': 'not-kept.html',
  'print.astro': 'print.html',
  'safety-poster.astro': 'safety-poster.html',
  'safety-record.astro': 'safety-record.html',
  'safety.astro': 'safety.html',
  'searches/[id].astro': 'searches/hot-lye.html',
  'sheets/[sheet].astro': 'sheets/QY-018-pilot.html',
  'shopping.astro': 'shopping.html',
  'sizes/[code].astro': 'sizes/QY-018.html',
  'working/[code].astro': 'working/QY-018.html',
};

/** The pages of all kinds, and a formula of a liquid, which has parts that a bar has not. */
export const PAGES_OF_KINDS: readonly string[] = [
  ...Object.values(PAGE_KINDS).filter((path) => path !== null),
  'formulas/QY-032.html',
];
