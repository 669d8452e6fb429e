import type { methodWords as english } from '../en/methods.ts';
import { withDecimalSign } from '../numbers.ts';
import type { SameShape } from '../same-shape.ts';
import { batchMethods } from './methods-batch.ts';
import { materialMethods } from './methods-materials.ts';

/** Every model of this handbook, from the materials to the finished batch. */
export const methodWords: SameShape<typeof english> = [
  {
    id: 'molar-mass',
    title: 'Masas molares',
    text: 'Cada masa molar se suma a partir de los pesos atómicos estándar de sus elementos. Ninguna se escribe como producto ya hecho.',
    symbols: [
      ['n_k', 'átomos del elemento k en la fórmula', '1'],
      ['A_k', 'peso atómico estándar, abreviado', 'g/mol'],
    ],
    range: 'Los elementos de los datos de referencia.',
    ignores: 'La variación natural de los isótopos; aquí queda por debajo de la quinta cifra.',
    source:
      'IUPAC Commission on Isotopic Abundances and Atomic Weights, valores abreviados de 2021 (de memoria).',
  },
  {
    id: 'equivalents',
    title: 'Equivalentes saponificables',
    text: 'Un índice de saponificación dice cuánto hidróxido de potasio consume un gramo de una grasa. Dividido entre la masa molar del hidróxido de potasio es una cantidad de hidróxido, sea cual sea el álcali usado. El valor es el medido en una partida donde el taller lo tiene; si no, procede de la primera fuente en el orden declarado: el menor entre el punto medio de su intervalo y cualquier media documentada de muestras medidas. La acidez libre medida en una partida no añade nada, porque un índice de saponificación ya cuenta los ácidos libres; en un ácido libre, el índice de acidez es el índice de saponificación. Una mezcla preparada cuenta como sus partes.',
    symbols: [
      ['S_i', 'índice de saponificación de la grasa i', 'mg KOH/g'],
      ['m_i', 'masa de la grasa i', 'g'],
      ['e_i', 'equivalentes por gramo de la grasa i', 'mol/g'],
      ['E', 'equivalentes de todas las grasas, con la grasa de los líquidos', 'mol'],
    ],
    range: 'Grasas con índice de saponificación y su intervalo en los datos de referencia.',
    ignores:
      'Las grasas de después de la cocción, que no se cuentan en el álcali. El error de mezclado propio de una mezcla; que los ácidos libres de un glicérido no dan glicerol.',
    source: 'Definición del índice de saponificación: ISO 3657 (fórmula de memoria).',
  },
  {
    id: 'alkali',
    title: 'Álcali y sobreengrasado',
    text: 'El álcali deja sin saponificar la parte s de los equivalentes y neutraliza los ácidos que están presentes antes de la saponificación. La misma ecuación, invertida, da el sobreengrasado de cualquier juego de pesos, también de los redondeados. La masa pesada es la masa pura dividida entre la riqueza, y riqueza significa solo hidróxido. Un álcali que se vende con un mínimo se calcula con el extremo superior de su intervalo comercial, salvo que una partida tenga certificado: la lectura que deja menos álcali libre.',
    symbols: [
      ['n_OH', 'cantidad de hidróxido', 'mol'],
      ['s', 'sobreengrasado', '1'],
      ['n_acid', 'protones de ácido neutralizados antes de la saponificación', 'mol'],
      ['a', 'riqueza: hidróxido puro por masa tal como se pesa', '1'],
    ],
    range: 'Sobreengrasado de 0 a 25 %.',
    ignores:
      'La humedad y el dióxido de carbono tomados después de determinar la riqueza; mantenga cerrado el álcali.',
    source: 'Estequiometría.',
  },
  {
    id: 'acids',
    title: 'Ácidos que consumen álcali',
    text: 'Solo los ácidos presentes antes de la saponificación reciben álcali propio. Al pH del jabón, el ácido cítrico cede sus tres protones; el láctico y el acético, uno. Un ácido añadido después consume jabón y no recibe álcali. Donde hay álcali que compensa un ácido, la página muestra el sobreengrasado que resulta si se olvida ese ácido.',
    symbols: [
      ['z_j', 'protones que el ácido j cede en el jabón', '1'],
      ['m_j', 'masa del ácido puro', 'g'],
      ['M_j', 'masa molar', 'g/mol'],
    ],
    range: 'Ácidos cuya concentración está en los datos de referencia.',
    ignores: 'Los ésteres del ácido láctico concentrado, que consumen álcali lentamente.',
    source: 'Estequiometría; constantes de disociación del ácido cítrico a 25 °C (de memoria).',
  },
  {
    id: 'mixed-lye',
    title: 'Solución alcalina mixta',
    text: 'Las proporciones de hidróxido de sodio y de potasio se dan por cantidad de sustancia (primera ecuación) o por masa pura (segunda). El archivo tiene que decir cuál de las dos, porque difieren hasta en unos ocho puntos.',
    symbols: [
      ['x_Na', 'proporción de hidróxido de sodio por cantidad de sustancia', '1'],
      ['y_Na, y_K', 'proporciones por masa pura', '1'],
    ],
    range: 'Cualquier combinación de los dos.',
    // read when shown: the shop's locale decides the decimal sign
    get ignores() {
      return `El carbonato del álcali: con ácidos grasos libres (ácido esteárico) neutraliza una parte de ellos y desprende gas, lo que deja algo más de hidróxido para las grasas. Con ${withDecimalSign('0.5')} % de carbonato son unos ${withDecimalSign('0.3')} puntos porcentuales de sobreengrasado en un jabón rico en ácidos libres; no está en ninguno de los intervalos.`;
    },
    source: 'Estequiometría.',
  },
  {
    id: 'water',
    title: 'Agua',
    text: 'El agua se deduce de una de tres indicaciones: la concentración de la solución alcalina, el agua por álcali o un porcentaje de las grasas. Las dos primeras cuentan el álcali sólido tal como se pesa y la solución de reserva como hidróxido disuelto. El agua de los líquidos y de la solución de reserva cuenta; la página imprime lo que queda por añadir.',
    symbols: [
      ['c', 'concentración de la solución alcalina: álcali / (álcali + agua)', '1'],
      ['r', 'agua por álcali', 'g/g'],
      ['p', 'agua por grasas', 'g/g'],
    ],
    range: 'Se rechaza una solución de reserva más diluida que la solución alcalina pedida.',
    ignores: 'El agua de los aditivos y la que se evapora.',
    source: 'Definiciones de este manual.',
  },
  {
    id: 'margin',
    title: 'Margen de sobreengrasado',
    text: 'Una grasa es un intervalo, un álcali tiene una riqueza, una balanza redondea. El intervalo expandido combina sus incertidumbres típicas a primer orden con un factor de cobertura de 2; los intervalos se toman como rectangulares, y las partidas medidas, con su intervalo declarado. Está centrado en el sobreengrasado que dan los puntos medios de los intervalos y se corta en el peor caso. El peor caso pone cada grasa en su extremo inferior, la riqueza en el superior y la balanza en contra. De las ceras en el proceso en frío, los extremos inferiores cuentan solo el ácido libre. El margen propio de una fórmula deja fuera la balanza; cada tamaño de lote cuenta la suya.',
    symbols: [
      [
        'q',
        'cada intervalo que entra: índice de saponificación de cada grasa, riqueza de cada álcali, cada pesada',
        'la propia',
      ],
      ['u_q', 'incertidumbre típica de q', 'la propia'],
      ['U', 'semianchura del intervalo expandido', '1'],
    ],
    range: 'Primer orden: bueno mientras los intervalos sean un pequeño porcentaje de sus valores.',
    ignores:
      'La correlación entre grasas, los errores más allá de los intervalos publicados, la acidez de aditivos y líquidos, la humedad y el dióxido de carbono que el álcali tomó después de determinar su riqueza, los descuidos en la balanza.',
    source: 'JCGM 100:2008, Guía para la expresión de la incertidumbre de medida (de memoria).',
  },
  {
    id: 'rounding',
    title: 'Redondeo a la balanza',
    text: 'Las grasas, los líquidos y el agua van al escalón más próximo de la balanza; los ácidos, hacia arriba; el álcali, hacia abajo, y luego más abajo, escalón por escalón, hasta que el sobreengrasado recalculado con los pesos redondeados no quede por debajo del escrito. Donde eso desplaza el sobreengrasado más de lo que el taller permite, el tamaño es demasiado pequeño para la balanza y recibe una razón en lugar de pesadas.',
    symbols: [],
    range: 'Los escalones y las capacidades de las balanzas del taller.',
    ignores: 'La deriva de la balanza y el empuje del aire.',
    source: 'Procedimiento de este manual.',
  },
  {
    id: 'profile',
    title: 'Perfil de ácidos',
    text: 'Las composiciones son porcentajes en masa de todos los ácidos grasos: los puntos medios de los intervalos publicados, con un mínimo no indicado contado como 0, llevados a 100. Cada grasa entra con los ácidos grasos que contiene. La masa molar media es la media numérica; la media en masa es una trampa conocida y la da demasiado alta: en los aceites láuricos, lo bastante para desplazar un índice de saponificación en unos 7 mg KOH/g.',
    symbols: [
      ['w_k', 'fracción en masa del ácido k entre los ácidos grasos', '1'],
      ['M', 'masa molar media de los ácidos', 'g/mol'],
      ['F', 'ácidos grasos por masa de triglicérido puro', 'g/g'],
    ],
    range: 'Grasas cuya composición se conoce. Si falta una, no hay ningún perfil.',
    ignores: 'Los glicéridos parciales y los ácidos por debajo de los límites de las tablas.',
    // read when shown: the shop's locale decides the decimal sign
    get source() {
      return `Estequiometría; ${withDecimalSign('38.049')} g/mol es el glicerol menos tres aguas.`;
    },
  },
  {
    id: 'saponification-value',
    title: 'Índice de saponificación de las grasas',
    text: 'El valor de una mezcla es la media de sus grasas en masa. Un valor calculado a partir de una composición comprueba el intervalo tabulado y nunca lo sustituye.',
    symbols: [['f_i', 'fracción en masa de la grasa i', '1']],
    range:
      'Comprobación calculada: glicéridos con poca materia insaponificable y poco ácido libre.',
    ignores: 'Los ácidos libres y los glicéridos parciales en la comprobación calculada.',
    source: 'AOCS Cd 3a-94 (fórmula de memoria); ISO 3657 para medir.',
  },
  {
    id: 'iodine-value',
    title: 'Índice de yodo',
    text: 'Se suma sobre los ácidos con un factor para cada uno, para triglicéridos o para ácidos libres según sea la grasa. El ácido ricinoleico no está en la lista del método; su factor se deduce de su fórmula.',
    symbols: [
      ['P_k', 'porcentaje del ácido k', '%'],
      ['F_k', 'gramos de yodo por gramo de su glicérido o ácido libre', 'g/g'],
    ],
    // read when shown: the shop's locale decides the decimal sign
    get range() {
      return `No sirve para aceites de pescado. Da de menos por cálculo por encima de ${withDecimalSign('0.5')} % de materia insaponificable.`;
    },
    ignores: 'La materia insaturada que no es un ácido graso. Las ceras toman su valor tabulado.',
    source: 'AOCS Cd 1c-85 (reaprobado en 2009), ISO 3961 anexo B.',
  },
  {
    id: 'oxidisability',
    title: 'Oxidabilidad',
    text: 'Pondera los ácidos insaturados según la rapidez con que sus ésteres metílicos formaron peróxidos. El orden de los tres es seguro; las proporciones publicadas difieren, y este manual usa un conjunto y lo nombra.',
    symbols: [['18:1, 18:2, 18:3', 'porcentaje de ácido oleico, linoleico y linolénico', '%']],
    range: 'Compara fórmulas entre sí. No es una vida útil.',
    ignores: 'Los antioxidantes, los metales, la luz, el agua y el envase.',
    source: 'Fatemi y Hammond, Lipids 15 (1980) 379 (coeficientes de memoria).',
  },
  {
    id: 'bis-allylic',
    title: 'Posiciones bisalílicas',
    text: 'Cuenta los lugares entre dos dobles enlaces, donde la oxidación empieza con más facilidad.',
    symbols: [['18:2, 18:3', 'porcentaje de ácido linoleico y linolénico', '%']],
    range: 'Como en la oxidabilidad.',
    ignores: 'Como en la oxidabilidad.',
    source: 'Knothe, J. Am. Oil Chem. Soc. 79 (2002) 847 (coeficientes de memoria).',
  },
  {
    id: 'chain-length',
    title: 'Longitud media de cadena',
    text: 'Átomos de carbono por ácido graso, como media numérica.',
    symbols: [['C_k', 'átomos de carbono del ácido k', '1']],
    range: 'Grasas cuya composición se conoce.',
    ignores: 'Los alcoholes de las ceras.',
    source: 'Definición.',
  },
  {
    id: 'balance',
    title: 'Balance de masa, materia grasa total, glicerol',
    text: 'Lo que entra sale, hasta una parte en mil millones. Los glicéridos dan un mol de glicerol por cada tres de álcali; los ácidos libres dan agua; los ésteres de las ceras dan alcoholes. La materia grasa total (MGT) cuenta los ácidos del jabón, la grasa sin saponificar y la materia insaponificable. El secado quita solo agua, hasta la humedad de liberación del taller.',
    symbols: [
      ['m', 'masas nombradas por su índice', 'g'],
      [
        'm_rest',
        'agua de todos los orígenes, carbonato y otra materia inerte, aditivos y sus sales',
        'g',
      ],
    ],
    range: 'Reacción completa del álcali con las grasas.',
    ignores: 'La evaporación durante la elaboración y la reacción no terminada.',
    source: 'Estequiometría; materia grasa total como en ISO 685 (de memoria).',
  },
  {
    id: 'lye-heat',
    title: 'Temperatura de la solución alcalina',
    text: 'La temperatura que alcanzaría la solución alcalina desde un inicio declarado si no se perdiera calor: el calor de disolución con su dilución y el calor de neutralizar los ácidos, divididos entre su capacidad calorífica. Donde los conjuntos de datos difieren, se muestra el más caliente, con el más frío al lado. El agua reservada no está en el recipiente: la solución alcalina es más concentrada y más caliente, y la página dice cuánto más que con toda el agua.',
    symbols: [
      ['T_0', 'temperatura inicial del agua y del álcali', '°C'],
      ['q(r)', 'calor integral de disolución con r moles de agua por mol', 'kJ/mol'],
      ['c', 'capacidad calorífica de la solución alcalina', 'kJ/(kg K)'],
    ],
    range:
      'Solución de hidróxido de sodio dentro de las tablas. Ningún número para la de hidróxido de potasio, la mixta ni la de reserva; trátelas como si hirvieran. El calor de disolución a la concentración de una solución alcalina se conoce solo por un conjunto más antiguo; lo que un conjunto más nuevo suma a dilución infinita se añade en todas las concentraciones.',
    ignores:
      'El calor que pasa a la jarra y al aire, de modo que la solución alcalina real queda menos caliente. El hielo y los líquidos congelados.',
    source:
      'Tablas de los datos de referencia: Felder y Rousseau, tabla B.11, más el límite de Parker 1965; capacidades caloríficas de Laliberté 2009 y del CRC Handbook. El valor con 4 mol de agua se leyó impreso; los demás calores son de memoria.',
  },
  ...materialMethods,
  ...batchMethods,
];
