/** The whole handbook as one document to print. */
export const printPage = {
  title: 'The whole handbook, to print',
  about: 'the whole handbook as one document, with a cover and a list of contents',
  kicker: 'Formulary handbook',
  formulas: (count: number) => (count === 1 ? '1 formula' : `${count} formulas`),
  whatTitle: 'What this is',
  what: 'Every formula of this edition at every batch size, computed, rounded to the shop’s scales and checked. Weigh what it says. Nobody at the bench computes lye.',
  notTitle: 'What this is not',
  not: [
    'It is no substitute for the supplier’s safety data sheet, for local rules, or for a licensed practitioner’s advice. Those come first.',
    'Paper is not kept current. Before you weigh, compare the edition at the foot of the page with the handbook of the shop; paper of an older edition belongs in the bin.',
    'It is no bench sheet: there is no room in it to write what was weighed. Print the bench sheet of the batch for that.',
  ],
  leftOutTitle: 'What is left out',
  leftOut:
    'The working of each formula, the bench sheets, the sheets of materials that no formula uses, the contradictions between sources and the lists of the finder. They stand in the handbook itself.',
  checkLink: 'Is a sheet current?',
  previewNote: 'The chapters are put in when the handbook is built.',
  contents: 'Contents',
  noNumbers:
    'Printed from a browser, this list has no page numbers: the chapters stand in this order, and the head of every page names its chapter. Where the handbook is built, “npm run print” makes a PDF file with the numbers.',
  proofMark: 'Proof, not for use',
  of: 'of',
  parts: {
    safety: 'Safety and cautions',
    lye: 'Lye tables',
    fats: 'Fats in use',
    materials: 'Other materials in use, and lots',
    methods: 'Methods, sources and evidence',
    changes: 'Changes',
  },
} as const;
