import type { declaration as english } from '../en/declaration.ts';
import { statedMass } from '../measures.ts';
import { fixed, plain } from '../numbers.ts';
import type { SameShape } from '../same-shape.ts';

const METALS: Readonly<Record<string, string>> = { sodium: 'sodio', potassium: 'potasio' };

export const declaration: SameShape<typeof english> = {
  // names on a label: they are not translated
  names: {
    water: { eu: 'Aqua', us: 'Water' },
    perfume: { eu: 'Parfum', us: 'Fragrance' },
    glycerol: 'Glycerin',
  },
  noName: (metal, material) =>
    `[sin nombre INCI en los datos: sal de ${METALS[metal] ?? metal} de ${material}]`,
  title: 'Declaración de la etiqueta',
  check:
    'Un borrador. La persona responsable debe comprobar cada nombre, el orden y las declaraciones antes de imprimir nada.',
  lists: {
    formed: 'Tal como se forma: lo que contiene el jabón al liberarse',
    added: 'Tal como se añade: lo que se pesa',
  },
  formedLead:
    'El jabón, nombrado por su grasa; el glicerol; lo que queda sin saponificar; y el agua que queda. Lo que el álcali deja de una grasa y su materia insaponificable figuran con el nombre propio de la grasa.',
  addedLead:
    'El mismo jabón según lo que se pesa. Use una lista o la otra, nunca una mezcla de las dos.',
  regions: { eu: 'Unión Europea: Ingredients', us: 'Estados Unidos: Ingredients' },
  orders: {
    descending: '',
    'under-one-percent': 'menos de 1 %, en cualquier orden',
    colour: 'colorante, en cualquier orden',
  },
  columns: { name: 'Nombre', share: 'Proporción', order: 'Orden' },
  shares: 'Proporciones que determinan el orden',
  share: (percent) => (percent < 0.1 ? `menos de ${fixed(0.1, 1)} %` : `${fixed(percent, 1)} %`),
  perfume:
    'Todo lo que perfuma figura junto como Parfum (Fragrance); puede nombrarse por separado donde la persona responsable lo prefiera.',
  allergensTitle: 'Alérgenos de la fragancia',
  allergens: (threshold) =>
    `Se nombran por encima de ${plain(threshold)} % de un producto que se aclara, Reglamento (UE) 2023/1545.`,
  allergen: (name, percent) => `${name}: como máximo ${fixed(percent, 3)} %`,
  noFragrance: 'Según los datos, nada de lo que contiene es una fragancia.',
  allergensNone: 'Según las cifras de los proveedores, ninguno supera el umbral.',
  allergensUnknown: (names) =>
    `Los datos no contienen cifras del proveedor para: ${names.join('; ')}. Tome los nombres de la declaración de alérgenos del proveedor; sin ella la lista no está completa.`,
  netMassTitle: 'Peso neto',
  netMass: (label, wet, released, moisture, ounces) =>
    `${label}: para una pastilla vertida con ${statedMass(wet)} se calculan ${fixed(released, 1)} g (${fixed(ounces, 2)} oz) una vez seca hasta ${plain(moisture, 1)} % de agua. Sigue secándose: no declare más de lo que pese la pastilla más ligera el día de la venta.`,
  netMassUnknown: 'De lo que se envasa a mano: declare lo que indique la balanza.',
  namesBasis:
    'Nombres INCI y nombres para los Estados Unidos: de memoria, no comprobados con el diccionario. Orden de la lista: Reglamento (CE) 1223/2009, artículo 19, y 21 CFR 701.3, los dos de memoria. En los Estados Unidos, un producto que es jabón y nada más según 21 CFR 701.20 no necesita lista.',
  gap: 'Falta un nombre. Búsquelo en el diccionario INCI antes de usar esta lista.',
  claimsTitle: 'Qué se puede decir de él',
  claims: {
    vegan: 'Vegano',
    'palm-free': 'Sin palma',
    'nut-free': 'Sin frutos de cáscara ni cacahuete (maní)',
  },
  verdicts: { yes: 'por sus ingredientes', no: 'no', open: 'no se declara' },
  claimYes: {
    vegan: 'Ningún ingrediente está marcado como de origen animal.',
    'palm-free': 'Ningún ingrediente está marcado como procedente de la palma de aceite.',
    'nut-free':
      'Ningún ingrediente está marcado como procedente de frutos de cáscara o de cacahuete (maní).',
  },
  claimNo: (names) => `Debido a: ${names.join('; ')}.`,
  claimOpen: (names) =>
    `Los datos no saben lo suficiente de: ${names.join('; ')}. Pregunte al proveedor.`,
  shared: (names) =>
    `Los equipos del taller también entran en contacto con: ${names.join('; ')}. Solo eso ya puede impedir la declaración.`,
};
