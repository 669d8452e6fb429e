import type { Charge } from '../chemistry/charge.ts';
import type { AcidProfile } from '../chemistry/profile.ts';
import type { Reference } from '../reference/reference.ts';
import type { AlkaliLine, FatLine, Profile } from './document.ts';
import { alkaliInForce, decidingValue, fatInForce } from './lots.ts';

export function fatLine(
  { fat, mass, blend }: Charge['fats'][number],
  massOfFats: number,
  reference: Reference,
): FatLine {
  const record = reference.fats.get(fat.id);
  const lot = record?.core ? fatInForce(record.core, reference).lot : null;
  const deciding = lot && decidingValue(lot, fat.kind);
  const { value, low, high } = fat.saponificationValue;
  return {
    id: fat.id,
    ...(blend !== undefined && { blend }),
    mass,
    share: (100 * mass) / massOfFats,
    saponificationValue: {
      value,
      low,
      high,
      source: deciding?.method ?? record?.chosen.saponificationValue?.source ?? '',
      ...(lot && { lot: lot.lot }),
    },
  };
}

export function alkaliLines(charge: Charge, reference: Reference): readonly AlkaliLine[] {
  return charge.alkali.map(({ supply, moles, pureMass, weighedMass }) => {
    const record = reference.alkalis.get(supply.id);
    const lot = record ? alkaliInForce(record, reference).lot : null;
    const { value, low, high } = supply.assay;
    return {
      id: supply.id,
      moles,
      pureMass,
      assay: {
        value: value * 100,
        low: low * 100,
        high: high * 100,
        ...(lot && { lot: lot.lot }),
      },
      form: supply.form,
      weighedMass,
    };
  });
}

export function profileDocument(profile: AcidProfile): Profile {
  return {
    acids: Object.fromEntries(profile.acids.map(({ acid, share }) => [acid.id, share * 100])),
    saturated: profile.saturated * 100,
    monounsaturated: profile.monounsaturated * 100,
    polyunsaturated: profile.polyunsaturated * 100,
    saponificationValue: profile.saponificationValue,
    iodineValue: profile.iodineValue,
    oxidisability: profile.oxidisability,
    bisAllylicPositions: profile.bisAllylicPositions,
    meanChainLength: profile.meanChainLength,
    chainLengths: Object.fromEntries(
      [...profile.chainLengths].map(([carbons, share]) => [String(carbons), share * 100]),
    ),
    meanMolarMass: profile.meanMolarMass,
  };
}
