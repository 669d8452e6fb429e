export const methodsPage = {
  title: 'Methods',
  lead: 'Every number in this handbook comes from one of the models below. Each has a range; outside it the pages give a reason and no number. Masses are in grams, amounts in moles, and nothing is rounded before it is weighed or printed.',
  contents: 'Models',
  evidence: 'Evidence: what the models give, beside published values',
  contradictions: 'Contradictions: where the sources do not agree',
  symbols: 'Symbols',
  range: 'Range',
  ignores: 'What it leaves out',
  source: 'Source',
  sourcesTitle: 'Sources of the reference data',
  sourcesLead:
    'Sources are never averaged. Where several give a value, the first by this order of kinds is used, and the others stay on the fat’s page.',
  columns: { source: 'Source', kind: 'Kind', read: 'Read on', address: 'Address' },
  notRead: 'not read for this handbook',
} as const;
