import type { Catalogue } from './catalogue.ts';
import { anySizePage, anySizeWords } from './es/any-size.ts';
import { approvalLines } from './es/approval-lines.ts';
import { breachText } from './es/breaches.ts';
import { cardWords } from './es/card.ts';
import { cautionTexts } from './es/cautions.ts';
import { cautionNames } from './es/cautions-names.ts';
import { changesPage } from './es/changes-page.ts';
import { checkPage } from './es/check-page.ts';
import { contentsPage } from './es/contents-page.ts';
import { contradictionsPage } from './es/contradictions-page.ts';
import { declaration } from './es/declaration.ts';
import { evidencePage } from './es/evidence-page.ts';
import { fatPages } from './es/fat-pages.ts';
import { findWords } from './es/find.ts';
import { findCost } from './es/find-cost.ts';
import { formulaPage } from './es/formula-page.ts';
import { frame } from './es/frame.ts';
import { hazardWords, STATEMENTS } from './es/hazard-statements.ts';
import { keptCopy } from './es/kept-copy.ts';
import { lostPage } from './es/lost-page.ts';
import { lotsPage } from './es/lots-page.ts';
import { lyeHeatWords } from './es/lye-heat.ts';
import { lyePage } from './es/lye-page.ts';
import { marginWords } from './es/margin.ts';
import { materialPages } from './es/material-pages.ts';
import { methodWords } from './es/methods.ts';
import { methodsPage } from './es/methods-page.ts';
import { printPage } from './es/print-page.ts';
import { profileWords, propertyNames, propertyUnits } from './es/profile.ts';
import { safetyPage } from './es/safety.ts';
import { safetySections } from './es/safety-sections.ts';
import { safetyPoster, safetyRecord } from './es/safety-sheets.ts';
import { sheetWords } from './es/sheet.ts';
import { shopping } from './es/shopping.ts';
import { standingWords } from './es/standing.ts';
import { starterFormula } from './es/starter-formula.ts';
import { titrationLines } from './es/titration-lines.ts';
import { withdrawnPage } from './es/withdrawn-page.ts';
import { workingWords } from './es/working.ts';
import { dilutionWords, yieldWords } from './es/yields.ts';

/** Every word that is shown, in Spanish. */
export const spanish: Catalogue = {
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
};
