import { massIn } from '../../chemistry/balance.ts';
import type { ComputedFormula } from '../../formulary/formulary.ts';
import type { Reference } from '../../reference/reference.ts';
import { asAdded } from './as-added.ts';
import { asFormed } from './as-formed.ts';
import { type ClaimVerdict, claims } from './claims.ts';
import { type FragranceAllergens, fragranceAllergens } from './fragrance-allergens.ts';
import { type DeclaredIngredient, declared, type Region } from './ingredient.ts';
import { type NetMass, netMasses } from './net-mass.ts';

type Lists = Readonly<Record<Region, readonly DeclaredIngredient[]>>;

/** A draft of what the label of one formula says. The responsible person has to check it. */
export interface Declaration {
  /** What goes in, by its mass then. */
  readonly added: Lists;
  /** What the soap holds at release. */
  readonly formed: Lists;
  readonly fragrance: FragranceAllergens;
  readonly claims: readonly ClaimVerdict[];
  readonly netMasses: readonly NetMass[];
}

/** The declaration of one formula, by its unrounded masses. */
export function declarationOf(computed: ComputedFormula, reference: Reference): Declaration {
  const { charge, document } = computed;
  const added = asAdded(charge, reference);
  const formed = asFormed(computed, reference);
  const lists = (list: typeof added, whole: number): Lists => ({
    eu: declared(list, 'eu', whole),
    us: declared(list, 'us', whole),
  });
  return {
    added: lists(added, massIn(charge)),
    formed: lists(formed, document.yield.releasedMass),
    fragrance: fragranceAllergens(computed, reference),
    claims: claims(charge, reference),
    netMasses: netMasses(document, reference.shop),
  };
}
