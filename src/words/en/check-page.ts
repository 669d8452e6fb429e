import { dateText } from '../dates.ts';
/** Words of the page on which a printed sheet is checked against the edition. */
export const checkPage = {
  title: 'Check a sheet',
  about: 'whether a printed sheet is the current one; all current digests',
  lead: 'Type what stands at the top of a printed sheet or card. Capitals, dashes and spaces do not matter; one wrong symbol is found.',
  code: 'Code',
  codeHint: (code: string) => `as ${code}`,
  digest: 'Weights digest',
  digestHint: 'thirteen symbols, as on the sheet after “Weights”',
  button: 'Check',
  needsScripts: 'Without scripts, look the digest up in the list below.',
  broken: 'The list of sheets could not be loaded. Look the digest up in the list below.',
  missing: 'Type both: the code and the digest.',
  current: (code: string, revision: number) =>
    `Current. This is the sheet of ${code}, revision ${revision}, in this edition.`,
  superseded: (code: string, revision: number, by: number, on: string) =>
    `Superseded. ${code}, revision ${revision}, has been replaced by revision ${by} since ${dateText(on)}. Do not weigh by it; print the new sheet.`,
  reweighed: (code: string, revision: number, on: string) =>
    `Superseded. ${code}, revision ${revision}, is weighed otherwise since ${dateText(on)}: lots or settings have changed. Do not weigh by it; print the new sheet.`,
  left: (code: string, revision: number, on: string) =>
    `No longer in the edition since ${dateText(on)}: ${code}, revision ${revision}. Do not weigh by it; ask the formulator.`,
  withdrawn: (code: string, on: string) =>
    `Withdrawn on ${dateText(on)}: ${code} must not be made. Ask the formulator.`,
  unknown: 'Unknown. This edition knows no such sheet. Do not weigh by it; ask the formulator.',
  mistypedDigest:
    'The digest has a symbol that is wrong, missing or too many. Read it from the sheet once more.',
  mistypedCode: 'The digest is that of another formula. Read the code from the sheet once more.',
  proof: 'This is a proof edition: what it holds that is not approved is current nowhere.',
  listTitle: 'All current digests',
  listLead: (edition: string, asOf: string) =>
    `Edition ${edition} as of ${dateText(asOf)}. A sheet whose digest does not stand here is not current.`,
  columns: {
    code: 'Code',
    formula: 'Formula',
    revision: 'Revision',
    size: 'Size',
    digest: 'Weights digest',
  },
  nothing: 'No formula of this edition is approved.',
  withdrawnTitle: 'Withdrawn',
  withdrawnOn: (on: string) => `withdrawn on ${dateText(on)}`,
  whatItProves:
    'A digest shows that a sheet is the one that was published. It detects change, not forgery.',
} as const;
