import type { Known } from '../../src/formulary/known.ts';

const named = (entries: Readonly<Record<string, string>>) =>
  new Map(Object.entries(entries).map(([id, name]) => [id, { name }]));

/** A little world of its own, so that these tests do not move with the data. */
export const KNOWN: Known = {
  fats: new Map([
    ['olive', { name: 'Olive oil', core: {} }],
    ['coconut', { name: 'Coconut oil', core: {} }],
    ['castor', { name: 'Castor oil', core: {} }],
    ['shea', { name: 'Shea butter', core: {} }],
    ['mystery', { name: 'Mystery butter', core: null }],
  ]),
  blends: new Map([
    [
      'quick',
      {
        name: 'Quick base',
        parts: [
          { fat: 'coconut', share: 60 },
          { fat: 'shea', share: 40 },
        ],
      },
    ],
  ]),
  additives: named({ kaolin: 'Kaolin', 'sodium-lactate-60': 'Sodium lactate, 60 %' }),
  liquids: named({ 'goat-milk': 'Goat milk' }),
  batches: new Map([
    ['pilot', { name: 'Pilot', kinds: ['bar', 'paste', 'liquid'] }],
    ['tray', { name: 'Tray of 48', kinds: ['bar'] }],
    ['kettle', { name: 'Kettle', kinds: ['paste', 'liquid'] }],
  ]),
};

/** A formula without a fault. */
export const SOUND = `---
code: QY-014
name: Harbour Lamp
kind: bar
process: cold
revision: 1
fats:
  - { fat: olive, share: 60 }
  - { fat: coconut, share: 40 }
alkali: { sodium: 100 }
superfat: 5
water: { lye-concentration: 32 }
targets: { fats: 38 C, lye: -2.5 C, combine: 35-40 C, cure: 42 d }
---

## Method

1. Stir :alkali[sodium] into :water.
2. Melt :weight[coconut] with :weight[olive].
`;
