export const lyePage = {
  title: (label: string) => `Lye table: ${label}`,
  lead: 'Weigh the alkali and the water of one line. The code stands at both ends of the line: they must be the same.',
  order: 'Alkali into water, never water onto alkali.',
  columns: {
    code: 'Code',
    name: 'Formula',
    also: 'Also into the lye',
    water: 'Water',
    revision: 'Rev.',
  },
  heldBack: 'Water held back',
  none: '—',
  refused: 'No weights at this size:',
  csv: 'This table as CSV',
} as const;
