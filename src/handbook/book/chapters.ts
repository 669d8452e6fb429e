import type { Formulary } from '../../formulary/formulary.ts';
import { words } from '../../words/catalogue.ts';
import { sizesInUse } from '../batch-sizes.ts';
import { contentsGroups } from '../contents.ts';
import { usesOf } from '../fat-sheet.ts';
import { sheetMaterials } from '../materials/material-sheet.ts';
import { usesOfMaterial } from '../materials/uses.ts';

/** A page of the handbook as a chapter of the one document. */
export interface Chapter {
  /** Name of the page in the handbook, `formulas/QY-014.html`. */
  readonly page: string;
  /** Where it begins in the document, and the beginning of every id in it; unique. */
  readonly id: string;
  /** What the head of each of its printed pages says. */
  readonly title: string;
  /** Whether it is printed across, because its table is as wide as a sheet. */
  readonly across: boolean;
}

export interface Part {
  readonly title: string;
  readonly chapters: readonly Chapter[];
}

/**
 * What the whole handbook holds as one document, in the order of print: what saves eyes first, then what is
 * weighed, then what it is weighed by. Materials that no formula uses, the working, the bench sheets and the lists
 * of the finder are left out.
 */
export function bookParts(formulary: Formulary): readonly Part[] {
  const { reference } = formulary;
  const { printPage: text } = words;
  const fats = [...reference.fats.values()].filter(({ id }) => usesOf(id, formulary).length > 0);
  const materials = sheetMaterials(reference).filter(
    ({ record }) => usesOfMaterial(record.id, formulary).length > 0,
  );
  const parts: Part[] = [
    {
      title: text.parts.safety,
      chapters: [
        chapter('safety.html', words.safetyPage.title),
        chapter('lists/cautions.html', words.findWords.listTitles.cautions),
      ],
    },
    ...contentsGroups(formulary).map(({ title, formulas }) => ({
      title,
      chapters: formulas.map(({ document: { code, name } }) =>
        chapter(`formulas/${code}.html`, `${code} ${name}`),
      ),
    })),
    {
      title: text.parts.lye,
      chapters: [
        ...sizesInUse(formulary).map(({ id, label }) =>
          chapter(`lye/${id}.html`, words.lyePage.title(label), true),
        ),
        chapter('lye/fats.html', words.lyePage.fats.title, true),
      ],
    },
    {
      title: text.parts.fats,
      chapters: fats.map(({ id, name }) => chapter(`fats/${id}.html`, name)),
    },
    {
      title: text.parts.materials,
      chapters: [
        ...materials.map(({ record }) => chapter(`materials/${record.id}.html`, record.name)),
        chapter('lots.html', words.lotsPage.title),
      ],
    },
    {
      title: text.parts.methods,
      chapters: [
        chapter('methods.html', words.methodsPage.title),
        chapter('evidence.html', words.evidencePage.title),
      ],
    },
    { title: text.parts.changes, chapters: [chapter('changes.html', words.changesPage.title)] },
  ];
  return parts.filter(({ chapters }) => chapters.length > 0);
}

const chapter = (page: string, title: string, across = false): Chapter => ({
  page,
  id: page.replace(/\.html$/, '').replaceAll('/', '-'),
  title,
  across,
});
