import type { materialPages as english } from '../en/material-pages.ts';
import { totalMass } from '../measures.ts';
import { fixed, plain } from '../numbers.ts';
import type { SameShape } from '../same-shape.ts';

export const materialPages: SameShape<typeof english> = {
  title: 'Materiales',
  about: 'Álcalis, aditivos y líquidos; alérgenos y un orden de elaboración',
  lead: 'Lo que entra además de las grasas y el agua. Cada grasa tiene su propia página entre las grasas.',
  fats: 'Todas las grasas',
  shopping: 'Lista de compras',
  groups: { alkali: 'Álcalis', additive: 'Aditivos', liquid: 'Líquidos' },
  columns: { name: 'Material', kind: 'Clase', formulas: 'Fórmulas' },
  unused: 'Conocidos, sin uso',
  kinds: {
    alkali: 'álcali',
    liquid: 'líquido',
    acid: 'ácido',
    salt: 'sal',
    sugar: 'azúcar',
    clay: 'arcilla',
    mineral: 'mineral',
    colour: 'colorante',
    fragrance: 'fragancia',
    botanical: 'materia vegetal',
    antioxidant: 'antioxidante',
    chelator: 'quelante',
    solvent: 'disolvente',
    other: 'otro',
  },
  origins: {
    plant: 'de origen vegetal',
    animal: 'de origen animal',
    mineral: 'mineral',
    synthetic: 'sintético',
  },
  allergens: (list) => `fuente de alérgenos: ${list.join(', ')}`,
  sections: {
    what: 'Qué es',
    values: 'Valores',
    lots: 'Partidas',
    cautions: 'Advertencias',
    storage: 'Almacenamiento y reanálisis',
    used: 'Dónde se usa',
    gone: 'Si se agota',
  },
  values: {
    assay: 'Hidróxido, puro',
    content: 'Contenido',
    water: 'Agua',
    fat: 'Grasa',
    sugar: 'Azúcar',
    acid: 'Ácido',
    'maximum-in-product': 'Máximo en el jabón, según el proveedor',
    'flash-point': 'Punto de inflamación',
  },
  valueColumns: { what: 'Qué', value: 'Valor', source: 'Fuente', how: 'Cómo se sabe' },
  noValues: 'Los datos no dan cifras de este material.',
  inci: (name) => `INCI: ${name} (de memoria, debe comprobarse en el diccionario)`,
  reckoned: {
    water: (percent) => `Se cuenta como ${percent} % de agua.`,
    acid: (grams) =>
      `100 g consumen ${grams} g de hidróxido de sodio puro. Donde entra antes de la saponificación, la fórmula añade ese álcali.`,
    neutral: 'No consume álcali.',
  },
  noLots:
    'Los datos no llevan partidas de este material. Copie la partida del envase en la hoja de trabajo.',
  lotColumns: {
    lot: 'Partida',
    status: 'Estado',
    assay: 'Hidróxido',
    carbonate: 'Carbonato',
    opened: 'Abierta',
    retest: 'Reanalizar a más tardar',
  },
  statuses: { quarantine: 'en cuarentena', released: 'liberada', rejected: 'rechazada' },
  assay: (value, uncertainty) => `${plain(value, 2)} ± ${plain(uncertainty, 2)} %`,
  retestPassed: 'la fecha de reanálisis ya pasó',
  noLotReleased:
    'No hay ninguna partida liberada: las fórmulas se calculan con el intervalo comercial.',
  dataSheet: 'La ficha de datos de seguridad (FDS) del proveedor va primero.',
  alkaliCaution:
    'Corrosivo, sólido y en la solución alcalina. Lea y firme la página de seguridad antes de abrirlo.',
  safety: 'Página de seguridad',
  noCautions: 'Aquí no se sabe nada más.',
  storage: {
    alkali:
      'Hermético, seco, en su envase original, bajo llave y lejos de ácidos, metales y alimentos. Toma agua y dióxido de carbono del aire: si se ha apelmazado, titúlelo antes de usarlo.',
    fat: 'En lugar fresco y oscuro, cerrada, con el envase lleno. Gaste primero y compre en poca cantidad los aceites ricos en ácidos poliinsaturados. No pese lo que huela a pintura, a pescado o a nuez rancia.',
    liquid:
      'Frío y cerrado; los frescos se congelan en porciones de un lote. Úselo antes de la fecha del envase.',
    acid: 'Seco y cerrado, lejos del álcali.',
    sugar: 'Seco y cerrado.',
    clay: 'Seca y cerrada; absorbe agua y olores.',
    colour: 'Seco y cerrado; péselo sin levantar polvo.',
    fragrance:
      'En lugar fresco y oscuro, de pie, en el frasco del proveedor; lejos de las llamas. Anote el día en que se abrió.',
    botanical: 'Seca, a oscuras y fresca; deseche la que huela a rancio o tenga telarañas.',
    antioxidant: 'En lugar fresco y oscuro, cerrado; anote el día en que se abrió.',
    solvent:
      'Cerrado. Los inflamables, en el armario destinado a ellos, lejos de llamas y placas calientes.',
    other: 'Seco y cerrado, en el envase del proveedor.',
  },
  storageBasis: 'Práctica común, sin fuente. Las fechas de reanálisis están junto a las partidas.',
  notUsed: 'Ninguna fórmula lo usa.',
  useColumns: { formula: 'Fórmula', share: 'De las grasas' },
  kilograms: (grams) => totalMass(grams),
  share: (percent) => `${fixed(percent, 2)} %`,
  goneNone: 'Todas las fórmulas se pueden elaborar igualmente.',
  cannot: (count, approved, all) =>
    `${count} de ${all} fórmulas no se pueden elaborar; de ellas, aprobadas: ${approved}. Son las de “Dónde se usa”. Nada lo sustituye peso por peso; una fórmula con otro material es otra fórmula.`,
  can: (count) => (count === 0 ? 'No queda ninguna.' : `Todavía se pueden elaborar ${count}:`),
  notApproved: 'no aprobada',
  allergensTitle: 'Alérgenos en equipos compartidos',
  allergensLead:
    'Si todas las fórmulas se elaboran con los mismos recipientes, batidoras y moldes, estos son los que pasan por ellos. Según las marcas de los datos, no por análisis.',
  allergensNone: 'Ninguna fórmula lleva un material marcado como fuente de alérgenos.',
  allergenColumns: { source: 'Fuente', materials: 'Llega con', formulas: 'Fórmulas' },
  orderTitle: 'Un orden de elaboración que deja los alérgenos para el final',
  orderLead:
    'De arriba abajo; dentro de cada paso, en cualquier orden. Práctica común, sin fuente. Una limpieza a fondo es el lavado completo de todo lo que tocó jabón, con una mirada a las cuchillas de la batidora.',
  noAllergens: 'Sin fuente marcada',
  cleanOf: (sources) =>
    `Primero, limpieza a fondo: no debe quedar rastro de ${sources.join(', ')}.`,
};
