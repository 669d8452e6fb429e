import { voice } from '../voice.ts';

/** A formula file to start from: sound as it stands, with every key explained where it is written. */
export function starterFormula(code: string, name: string, day: string): string {
  return `---
# Everything after a "#" is a note to you. Lines that begin with "#" can be deleted.
code: ${code}
name: ${quoted(name)}
kind: bar            # bar, paste or liquid
process: cold        # cold or hot
revision: 1
summary: Say in one sentence what this soap is.

# Percent of the fats by mass; together exactly 100. The ids are the file names in data/fats.
fats:
  - { fat: olive, share: 60 }
  - { fat: coconut, share: 30 }
  - { fat: castor, share: 10 }

# Mixed lye: { sodium: 40, potassium: 60, basis: moles }, or basis: mass.
alkali: { sodium: 100 }

# Percent of the fats left unsaponified.
superfat: 7

# One of lye-concentration: 32 (percent), per-alkali: 2.1 or percent-of-fats: 33.
# Add hold-back: 20 to keep 20 % of the water out of the lye.
water: { lye-concentration: 32 }

# at: lye, fats, trace, after-cook or dilution. Acids at lye, fats or trace get alkali of their own.
# additives:
#   - { additive: kaolin, percent-of-fats: 1, at: trace }
# liquids:
#   - { liquid: goat-milk, replaces-water: 50, at: lye }

# Earlier soap that may be worked in, in percent of the batter; it counts in no weight.
# rework: 5

targets: { ${temperatures()}, unmould: 24-36 h, cure: 42 d }

# Limits that a batch must meet before it is released; the methods are named on the sheet.
release: { free-alkali: 0.05, ph: [9, 10.5], moisture: 12 }

# Leave batches out to offer all of the shop's sizes that suit the kind.
# batches: [pilot]
tags: []
changes:
  - { revision: 1, on: ${day}, note: First version. }
---

## Method

1. Read the supplier's safety data sheet. Goggles and gloves on; no aluminium vessels.
2. Weigh :water of cold water into a steel or polypropylene jug.
3. Stir in :alkali[sodium] of sodium hydroxide a little at a time. Alkali into water, never water onto
   alkali. Leave the lye to cool to :temperature[lye].
4. Melt :weight[coconut] of coconut oil, add :weight[olive] of olive oil and :weight[castor] of castor
   oil, and bring the fats to :temperature[fats].
5. Combine at :temperature[combine] and blend to a light trace.
6. Pour, cover and leave for :time[unmould].
7. Unmould with gloves, cut, and cure for :time[cure].
`;
}

/** A name as YAML: plain where nothing in it could be taken for something else. */
function quoted(name: string): string {
  const plain = /^\p{L}[\p{L}\p{N}]*( [\p{L}\p{N}]+)*$/u.test(name);
  return plain && !/^(true|false|null)$/i.test(name) ? name : JSON.stringify(name);
}

/** In the degrees of the shop. */
const temperatures = () =>
  voice().units === 'us'
    ? 'fats: 100 F, lye: 95 F, combine: 95-105 F'
    : 'fats: 38 C, lye: 35 C, combine: 35-40 C';
