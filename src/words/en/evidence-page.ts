/** Words of the table of computed against published values. */
export const evidencePage = {
  title: 'Evidence',
  about: 'what the models give, beside what others have published',
  lead: 'What the models of this handbook give, beside what others have published. The tests run these very records before anything is built: a row that does not agree stops the build unless its reason stands here, and a reason that is no longer needed stops it too.',
  counts: (of: {
    readonly rows: number;
    readonly read: number;
    readonly sources: number;
    readonly memory: number;
    readonly practice: number;
    readonly known: number;
  }) =>
    `${of.rows} rows: ${of.read} against ${of.sources} publications that were read, ${of.memory} against values known from memory only, ${of.practice} rules of the trade without a source. ${of.known} do not agree, each with its reason.`,
  groups: {
    'molar-mass': 'Molar masses',
    'equivalent-1908': 'Saponification equivalents of pure glycerides, by the weights of 1908',
    'iodine-factor': 'Iodine factors, from first principles',
    titration: 'A printed titration',
    'saponification-value': 'Saponification values, computed from the composition in use',
    'iodine-value': 'Iodine values, computed from the composition in use',
    'acid-share': 'Rules of the trade about acids',
    glycerol: 'Glycerol',
    wax: 'Wax esters',
    'lye-density': 'Density of lye',
    'lye-heat': 'Heat of solution',
  },
  columns: {
    subject: 'What',
    computed: 'Computed',
    published: 'Published',
    tolerance: 'Tolerance',
    deviation: 'Off by',
    verdict: 'Agrees',
    source: 'Source',
  },
  agrees: 'yes',
  disagrees: 'no',
  atLeast: (value: string) => `at least ${value}`,
  atMost: (value: string) => `at most ${value}`,
  between: (low: string, high: string) => `${low} to ${high}`,
  inside: 'inside',
} as const;
