import type { safetyPage as english } from '../en/safety.ts';
import { temperature } from '../measures.ts';
import { fixed } from '../numbers.ts';
import type { SameShape } from '../same-shape.ts';

/** The safety page around its sections. Sentences without a code or a source are common practice. */
export const safetyPage: SameShape<typeof english> = {
  title: 'Seguridad',
  first:
    'La ficha de datos de seguridad (FDS) del proveedor va primero. Después, la ley del lugar, las reglas de su empresa y las indicaciones de los profesionales habilitados. Después, esta página. En caso de lesión, haga lo que digan los servicios de emergencia y el médico.',
  reading:
    'Unos diez minutos. Léala entera antes de su primera solución alcalina, y otra vez cada año.',
  poster: 'Cartel para la pared',
  record: 'Registro para firmar',
  booklet:
    'Esta página se imprime en A5. Para obtener un cuadernillo que se dobla, elija “folleto” en la ventana de la impresora.',
  emergencyTitle: 'En una emergencia',
  noEmergency:
    'ESTE TALLER NO TIENE REGISTRADO NINGÚN NÚMERO DE EMERGENCIA. Nadie trabaja con solución alcalina antes de que los números estén en data/shop.yaml y aquí.',
  practice:
    'Las frases sin código son práctica común, sin fuente. Códigos como P305 señalan frases oficiales, todas reunidas al final; donde dicen “varios minutos”, los veinte minutos de aquí son más y son los que valen. La ficha de datos de seguridad va antes que esta página.',
  neverNeutralise:
    'Nunca ponga vinagre, ácido ni ningún otro “antídoto” sobre la piel ni en los ojos. Agua.',
  firstAidTitle: 'Primeros auxilios',
  firstAidLead:
    'La solución alcalina sigue quemando aunque haya dejado de doler. Enjuague de inmediato, pida ayuda a gritos y que otra persona llame por teléfono.',
  tell: 'Diga por teléfono: un álcali corrosivo, hidróxido de sodio o de potasio; su concentración (el porcentaje de la hoja de trabajo), si la sabe; qué parte del cuerpo; desde cuándo; dónde está usted. La etiqueta y la ficha de datos de seguridad acompañan a la persona lesionada.',
  firstAid: [
    {
      route: 'En los ojos',
      code: 'P305+P351+P338',
      short: 'Enjuague sin parar, con los párpados abiertos. Que otra persona llame por teléfono.',
      practice:
        'En segundos, con el agua limpia más cercana. Mantenga abiertos los párpados; enjuague desde la nariz hacia fuera, para que nada corra hacia el otro ojo. Siga durante veinte minutos como mínimo, y hasta que la ayuda se haga cargo, también durante el traslado. Toda salpicadura de solución alcalina en un ojo es una emergencia: se llama de inmediato a los servicios de emergencia, y el enjuague sigue durante todo el traslado.',
    },
    {
      route: 'En la piel o en el pelo',
      code: 'P303+P361+P353',
      short: 'Sacuda el álcali seco, ropa fuera, agua, veinte minutos.',
      practice:
        'Primero quite el álcali seco, sacudiéndolo o con un cepillo. Quítese la ropa, el calzado y los anillos bajo el agua corriente; corte un suéter antes que sacarlo por encima de la cara. Lo que está pegado a la piel se deja en ella y se enjuaga por encima. Siga durante veinte minutos como mínimo. Ni cremas ni aceites. Una piel que se siente jabonosa todavía no está enjuagada. Si el enrojecimiento no se va, si hay una ampolla, o si afecta a la cara, a las manos o a una zona grande: al médico.',
    },
    {
      route: 'Por ingestión',
      code: 'P301+P330+P331',
      short: 'Enjuague la boca y escupa. No provoque el vómito. Llame por teléfono de inmediato.',
      practice:
        'Llame de inmediato al número de emergencia. Nada para neutralizarlo y nada de comer; beba solo lo que diga el centro de toxicología o un médico.',
    },
    {
      route: 'Por inhalación',
      code: 'P304+P340',
      short: 'Aire fresco, sentarse erguido, llamar por teléfono, aunque la tos se pase.',
      practice:
        'Siéntese erguido al aire fresco. Consulte a un médico o al centro de toxicología aunque la tos se pase: la hinchazón puede venir más tarde.',
    },
  ],
  always: 'P310',
  laundry: 'P363',
  rulesTitle: 'Reglas de este taller',
  careTitle: 'Lo que aquí exige más cuidado',
  careLead:
    'Calculado con las fórmulas de esta edición. El sobreengrasado es la parte de las grasas que el álcali deja sin saponificar; por debajo de cero es álcali que sobra, y el jabón quema. Una fórmula por debajo del límite del taller está aquí solo con un permiso por escrito (una concesión), y su página dice por qué.',
  careDangers: 'Con una advertencia marcada como peligro',
  careNone: 'Ninguna fórmula lleva una advertencia marcada como peligro.',
  careHottest: 'La solución alcalina más caliente, si no perdiera calor',
  careUnknown: 'Calor de la solución alcalina sin número: cuente con que hierve',
  careLowest:
    'Sobreengrasado mínimo, con los errores de las balanzas (se nombra un tamaño de lote donde es el más bajo)',
  celsius: (value) => temperature(value),
  percent: (value) => `${fixed(value, 1)} %`,
  officialTitle: 'Frases oficiales',
  workplaceTitle: 'Límites en el lugar de trabajo',
  workplace: [
    'Hidróxido de sodio: valor techo recomendado por NIOSH, 2 mg/m³; límite permisible de OSHA, 2 mg/m³ como media de 8 horas; inmediatamente peligroso para la vida o la salud, 10 mg/m³ (cdc.gov/niosh/idlh/1310732.html, leído el 2026-12-01).',
    'Hidróxido de potasio: valor techo recomendado por NIOSH, 2 mg/m³; ningún límite de OSHA en vigor (de memoria).',
    'Otros países tienen los suyos.',
  ],
  signTitle: 'Firme que la ha leído',
  sign: 'Toda persona nueva que elabora, antes de su primera solución alcalina, y todas una vez al año. Imprima el registro, repáselo con una persona experimentada, fírmenlo ambas y guárdelo con los registros de elaboración.',
};
