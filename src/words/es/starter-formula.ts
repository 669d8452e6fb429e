import type { starterFormula as english } from '../en/starter-formula.ts';
import { voice } from '../voice.ts';

/** A formula file to start from: sound as it stands, with every key explained where it is written. */
export const starterFormula: typeof english = (code, name, day) => `---
# Todo lo que sigue a "#" es una nota para usted. Las líneas que empiezan con "#" se pueden borrar.
# Las claves y los ids quedan en inglés.
code: ${code}
name: ${quoted(name)}
kind: bar            # bar (pastilla), paste (pasta) o liquid (líquido)
process: cold        # cold (en frío) o hot (en caliente)
revision: 1
summary: Diga en una frase qué es este jabón.

# Porcentaje de las grasas en masa; en total exactamente 100. Los ids son los nombres de archivo de data/fats.
fats:
  - { fat: olive, share: 60 }
  - { fat: coconut, share: 30 }
  - { fat: castor, share: 10 }

# Solución alcalina mixta: { sodium: 40, potassium: 60, basis: moles }, o basis: mass.
alkali: { sodium: 100 }

# Sobreengrasado: porcentaje de las grasas que queda sin saponificar.
superfat: 7

# Una sola de estas: lye-concentration: 32 (porcentaje), per-alkali: 2.1 o percent-of-fats: 33.
# Añada hold-back: 20 para reservar el 20 % del agua fuera de la solución alcalina.
water: { lye-concentration: 32 }

# at: lye (solución alcalina), fats (grasas), trace (traza), after-cook (después de la cocción) o
# dilution (dilución). Los ácidos en lye, fats o trace reciben álcali propio.
# additives:
#   - { additive: kaolin, percent-of-fats: 1, at: trace }
# liquids:
#   - { liquid: goat-milk, replaces-water: 50, at: lye }

# Jabón anterior que se puede reprocesar, en porcentaje de la masa de jabón; no cuenta en ningún peso.
# rework: 5

targets: { ${temperatures()}, unmould: 24-36 h, cure: 42 d }

# Límites que un lote debe cumplir antes de liberarse; la hoja nombra los métodos.
release: { free-alkali: 0.05, ph: [9, 10.5], moisture: 12 }

# Omita batches para ofrecer todos los tamaños del taller que convienen a esta clase de jabón.
# batches: [pilot]
tags: []
changes:
  - { revision: 1, on: ${day}, note: Primera versión. }
---

## Método

1. Lea la ficha de datos de seguridad del proveedor. Gafas protectoras y guantes puestos; ningún recipiente
   de aluminio.
2. Pese :water de agua fría en una jarra de acero o de polipropileno.
3. Incorpore :alkali[sodium] de hidróxido de sodio poco a poco y removiendo. El álcali al agua, nunca agua
   sobre el álcali. Deje que la solución alcalina se enfríe a :temperature[lye].
4. Funda :weight[coconut] de aceite de coco, añada :weight[olive] de aceite de oliva y :weight[castor] de
   aceite de ricino, y lleve las grasas a :temperature[fats].
5. Mezcle todo a :temperature[combine] y bata hasta una traza ligera.
6. Vierta, cubra y deje reposar :time[unmould].
7. Desmolde con guantes, corte y deje curar :time[cure].
`;

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
