import type { Root } from 'mdast';
import type { Formula } from './formula.ts';
import type { Known } from './known.ts';
import type { Frontmatter } from './schema.ts';
import { parseTarget } from './target.ts';

/** A checked frontmatter and its text, in the project's own terms, with blends as their parts. */
export function assembleFormula(
  file: string,
  front: Frontmatter,
  blends: Known['blends'],
  text: { readonly method: Root; readonly methodText: string; readonly places: Formula['places'] },
): Formula {
  const { alkali, release, approval } = front;
  const [phLow, phHigh] = release?.ph ?? [];
  return {
    file,
    code: front.code,
    name: front.name,
    kind: front.kind,
    process: front.process,
    revision: front.revision,
    summary: front.summary ?? null,
    fats: front.fats.flatMap((entry) => partsOf(entry, blends)),
    afterCookFats: (front['after-cook-fats'] ?? []).map((entry) => ({
      fat: entry.fat,
      percentOfFats: entry['percent-of-fats'],
    })),
    alkali: {
      sodium: alkali.sodium ?? 0,
      potassium: alkali.potassium ?? 0,
      basis: alkali.basis ?? 'moles',
    },
    superfat: front.superfat,
    water: waterOf(front.water),
    liquids: (front.liquids ?? []).map((entry) => ({
      liquid: entry.liquid,
      replacesWater: entry['replaces-water'],
      at: entry.at,
    })),
    additives: (front.additives ?? []).map((entry) => ({
      additive: entry.additive,
      percentOfFats: entry['percent-of-fats'],
      at: entry.at,
    })),
    rework: front.rework ?? null,
    targets: Object.fromEntries(
      Object.entries(front.targets ?? {}).flatMap(([name, written]) => {
        const target = written ? parseTarget(written) : null;
        return target ? [[name, target]] : [];
      }),
    ),
    release: {
      freeAlkali: release?.['free-alkali'] ?? null,
      ph: phLow !== undefined && phHigh !== undefined ? [phLow, phHigh] : null,
      moisture: release?.moisture ?? null,
    },
    batches: front.batches ?? null,
    tags: front.tags ?? [],
    changes: [...(front.changes ?? [])].sort((a, b) => b.revision - a.revision),
    approval: approval
      ? {
          by: approval.by,
          on: approval.on,
          reviewBy: approval['review-by'],
          fingerprint: approval.fingerprint,
        }
      : null,
    concession: front.concession ?? null,
    withdrawn: front.withdrawn ?? null,
    ...text,
  };
}

function partsOf(
  { fat, blend, share }: Frontmatter['fats'][number],
  blends: Known['blends'],
): Formula['fats'] {
  if (fat !== undefined) return [{ fat, share }];
  const parts = blend === undefined ? undefined : blends.get(blend)?.parts;
  if (blend === undefined || !parts) {
    throw new RangeError('a blend that is not known is refused before the formula is assembled');
  }
  return parts.map((part) => ({ fat: part.fat, share: (share * part.share) / 100, blend }));
}

function waterOf(water: Frontmatter['water']): Formula['water'] {
  const holdBack = water['hold-back'] ?? 0;
  for (const form of ['lye-concentration', 'per-alkali', 'percent-of-fats'] as const) {
    const value = water[form];
    if (value !== undefined) return { form, value, holdBack };
  }
  throw new RangeError('a formula without water is refused before it is assembled');
}
