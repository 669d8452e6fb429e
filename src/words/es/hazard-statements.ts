import {
  type STATEMENTS as englishStatements,
  hazardWords as englishWords,
} from '../en/hazard-statements.ts';
import { fixed } from '../numbers.ts';
import type { SameShape } from '../same-shape.ts';

/**
 * Official Spanish wordings, quoted to the letter. `…` and what stands between strokes is left open by the regulation
 * for the supplier to complete or choose from.
 */
export const STATEMENTS: SameShape<typeof englishStatements> = {
  H290: 'Puede ser corrosivo para los metales.',
  H302: 'Nocivo en caso de ingestión.',
  H314: 'Provoca quemaduras graves en la piel y lesiones oculares graves.',
  H315: 'Provoca irritación cutánea.',
  H319: 'Provoca irritación ocular grave.',
  P234: 'Conservar únicamente en el embalaje original.',
  P260: 'No respirar el polvo/el humo/el gas/la niebla/los vapores/el aerosol.',
  P264: 'Lavarse … concienzudamente tras la manipulación.',
  P270: 'No comer, beber ni fumar durante su utilización.',
  P280: 'Llevar guantes/prendas/gafas/máscara de protección.',
  'P301+P330+P331': 'EN CASO DE INGESTIÓN: Enjuagar la boca. NO provocar el vómito.',
  'P303+P361+P353':
    'EN CASO DE CONTACTO CON LA PIEL (o el pelo): Quitar inmediatamente toda la ropa contaminada. Enjuagar la piel con agua [o ducharse].',
  'P304+P340':
    'EN CASO DE INHALACIÓN: Transportar a la persona al aire libre y mantenerla en una posición que le facilite la respiración.',
  'P305+P351+P338':
    'EN CASO DE CONTACTO CON LOS OJOS: Enjuagar con agua cuidadosamente durante varios minutos. Quitar las lentes de contacto cuando estén presentes y pueda hacerse con facilidad. Proseguir con el lavado.',
  P310: 'Llamar inmediatamente a un CENTRO DE TOXICOLOGÍA/médico/…',
  P363: 'Lavar las prendas contaminadas antes de volver a usarlas.',
  P390: 'Absorber el vertido para que no dañe otros materiales.',
  P405: 'Guardar bajo llave.',
  P406: 'Almacenar en un recipiente resistente a la corrosión /… en un recipiente con revestimiento interior resistente.',
  P501: 'Eliminar el contenido/el recipiente en …',
};

const PICTOGRAMS: Readonly<Record<string, string>> = {
  'GHS05 (corrosion)': 'GHS05 (corrosión)',
  'GHS05 (corrosion) and GHS07 (exclamation mark)':
    'GHS05 (corrosión) y GHS07 (signo de exclamación)',
};

export const hazardWords: SameShape<typeof englishWords> = {
  alkalis: englishWords.alkalis.map((alkali) => ({
    ...alkali,
    signal: 'Peligro',
    pictograms: PICTOGRAMS[alkali.pictograms] ?? alkali.pictograms,
  })),
  rows: {
    index: 'Número de índice, CLP, anexo VI',
    ec: 'Número CE',
    cas: 'Número CAS',
    harmonised: 'Clase armonizada',
    signal: 'Palabra de advertencia',
    pictograms: 'Pictograma',
  },
  limitsTitle: 'Hasta qué dilución sigue siendo peligroso',
  // read when shown: the shop's locale decides the decimal sign
  get limits(): SameShape<typeof englishWords>['limits'] {
    return [
      ['5 % o más', 'Skin Corr. 1A, H314'],
      ['2 % a menos de 5 %', 'Skin Corr. 1B, H314'],
      [`${fixed(0.5, 1)} % a menos de 2 %`, 'Skin Irrit. 2, H315; Eye Irrit. 2, H319'],
    ];
  },
  limitsColumns: ['Hidróxido en la mezcla', 'Clase'],
  limitsNote:
    'Límites de concentración específicos de los dos hidróxidos, CLP, anexo VI. Una solución alcalina al 25 % está cinco veces por encima del primero de ellos.',
  code: 'Código',
  statement: 'Texto oficial',
  applies: 'se aplica',
  source:
    'Texto: Reglamento (CE) n.º 1272/2008 (CLP), en español, texto consolidado en mhchem/hpstatements, versión de contenido 2025-09-01, © Unión Europea, CC BY 4.0; leído el 2026-12-01. Se ha corregido una errata: una letra con tilde de la frase sobre el centro de toxicología.',
  basis:
    'Números, clase y límites para la piel del hidróxido de sodio: hoja de Euro Chlor sobre su clasificación y ficha 20 del INRS, leídas. La entrada completa del hidróxido de potasio, los límites para los ojos, los pictogramas y qué consejos de prudencia imprime un proveedor: de memoria. H290 lo añaden los proveedores. Vale la etiqueta de su envase.',
  newer:
    'Las ediciones más recientes del SGA de las Naciones Unidas imprimen P316 en lugar de P310 (de memoria); las etiquetas de fuera de la Unión Europea pueden llevarlo.',
};
