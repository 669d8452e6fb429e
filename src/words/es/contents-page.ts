import type { contentsPage as english } from '../en/contents-page.ts';
import { fixed, plain } from '../numbers.ts';
import type { SameShape } from '../same-shape.ts';

export const contentsPage: SameShape<typeof english> = {
  lead: 'Cada fórmula de este manual se ha calculado, redondeado a los escalones de las balanzas del taller y comprobado. En el puesto de trabajo nadie calcula el álcali: busque la fórmula, elija el tamaño de lote y pese lo que dice la página.',
  beforeTitle: 'Antes de abrir el álcali',
  before:
    'Gafas protectoras, guantes, manga larga. El álcali al agua, nunca agua sobre el álcali. Agua para enjuagar al alcance de la mano.',
  beforeLink: 'Lea la página de seguridad',
  groups: {
    'bar cold': 'Pastillas, proceso en frío',
    'bar hot': 'Pastillas, proceso en caliente',
    'paste cold': 'Pastas, proceso en frío',
    'paste hot': 'Pastas, proceso en caliente',
    'liquid cold': 'Líquidos, proceso en frío',
    'liquid hot': 'Líquidos, proceso en caliente',
  },
  withdrawn: 'Retiradas',
  columns: { code: 'Código', formula: 'Fórmula', superfat: 'Sobreengrasado', lowest: 'Mínimo' },
  superfat: (percent) => `${plain(percent, 1)} %`,
  lowest: (percent) => `${fixed(percent, 1)} %`,
  lowestNote:
    'El sobreengrasado es aquel para el que está escrita la fórmula. El mínimo es el extremo inferior de su margen: hasta dónde puede bajar con la variación natural de las grasas y la riqueza del álcali.',
  find: 'Buscar por una palabra',
  findGo: 'Buscar',
  findMore: 'Buscar por palabras, grasas e intervalos de propiedades',
  lyeTitle: 'Tablas de álcali, por tamaño de lote',
  lyeLead:
    'Álcali y agua de todas las fórmulas en una sola hoja, para la pared junto a la balanza.',
  count: (n) => (n === 1 ? '1 fórmula' : `${n} fórmulas`),
  howTitle: 'Cómo se usa',
  how: [
    'Busque la fórmula por su código. El código de la etiqueta del molde y el código de la página deben ser el mismo.',
    'Use el bloque de su tamaño de lote y solo ese. Pese cada línea en un vaso propio, de arriba abajo; cada línea lleva su unidad.',
    'Compruebe que la partida del saco es la partida que nombra la página, cuando nombra una.',
    'Donde la página da un motivo en lugar de un peso, no hay peso. No lo calcule usted en el puesto de trabajo; pregunte a quien formula.',
    'En papel, mire la fecha de la parte superior. Una hoja de una edición anterior va a la basura.',
  ],
  moreTitle: 'También aquí',
  fats: 'cada grasa con sus ácidos, sus valores, las fuentes de estos y dónde se usa',
  methods:
    'cada modelo que está detrás de los números, con su ecuación, su intervalo y lo que deja fuera',
  safety: 'solución alcalina, equipo de protección, derrames, primeros auxilios',
  dataTitle: 'Como archivos',
  dataLead: 'Los mismos números para hojas de cálculo y programas, en gramos y grados Celsius:',
};
