import { anySizePage, anySizeWords } from './en/any-size.ts';
import { approvalLines } from './en/approval-lines.ts';
import { breachText } from './en/breaches.ts';
import { cardWords } from './en/card.ts';
import { cautionTexts } from './en/cautions.ts';
import { cautionNames } from './en/cautions-names.ts';
import { changesPage } from './en/changes-page.ts';
import { checkPage } from './en/check-page.ts';
import { contentsPage } from './en/contents-page.ts';
import { contradictionsPage } from './en/contradictions-page.ts';
import { declaration } from './en/declaration.ts';
import { evidencePage } from './en/evidence-page.ts';
import { fatPages } from './en/fat-pages.ts';
import { findWords } from './en/find.ts';
import { findCost } from './en/find-cost.ts';
import { formulaPage } from './en/formula-page.ts';
import { frame } from './en/frame.ts';
import { hazardWords, STATEMENTS } from './en/hazard-statements.ts';
import { keptCopy } from './en/kept-copy.ts';
import { lostPage } from './en/lost-page.ts';
import { lotsPage } from './en/lots-page.ts';
import { lyeHeatWords } from './en/lye-heat.ts';
import { lyePage } from './en/lye-page.ts';
import { marginWords } from './en/margin.ts';
import { materialPages } from './en/material-pages.ts';
import { methodWords } from './en/methods.ts';
import { methodsPage } from './en/methods-page.ts';
import { printPage } from './en/print-page.ts';
import { profileWords, propertyNames, propertyUnits } from './en/profile.ts';
import { safetyPage } from './en/safety.ts';
import { safetySections } from './en/safety-sections.ts';
import { safetyPoster, safetyRecord } from './en/safety-sheets.ts';
import { sheetWords } from './en/sheet.ts';
import { shopping } from './en/shopping.ts';
import { standingWords } from './en/standing.ts';
import { starterFormula } from './en/starter-formula.ts';
import { titrationLines } from './en/titration-lines.ts';
import { withdrawnPage } from './en/withdrawn-page.ts';
import { workingWords } from './en/working.ts';
import { dilutionWords, yieldWords } from './en/yields.ts';

/** Every word that is shown, in English. The other catalogues have its shape. */
export const english = {
  anySizePage,
  anySizeWords,
  approvalLines,
  cautionNames,
  cautionTexts,
  changesPage,
  checkPage,
  breachText,
  cardWords,
  contentsPage,
  contradictionsPage,
  declaration,
  dilutionWords,
  evidencePage,
  fatPages,
  findCost,
  findWords,
  formulaPage,
  frame,
  hazardWords,
  keptCopy,
  lostPage,
  lyeHeatWords,
  lotsPage,
  lyePage,
  marginWords,
  materialPages,
  methodWords,
  methodsPage,
  printPage,
  profileWords,
  propertyNames,
  propertyUnits,
  safetyPage,
  safetyPoster,
  safetyRecord,
  safetySections,
  shopping,
  sheetWords,
  standingWords,
  starterFormula,
  statements: STATEMENTS,
  titrationLines,
  withdrawnPage,
  workingWords,
  yieldWords,
} as const;
