import type { soapCautions as english } from '../en/cautions-soap.ts';
import { fixed, plain } from '../numbers.ts';
import type { SameShape } from '../same-shape.ts';

/** Cautions about the finished soap: keeping, skin, feel, allergens. */
export const soapCautions: SameShape<typeof english> = {
  'oxidises-early': (n) => ({
    text: `${fixed(n.polyunsaturated, 0)} % de ácidos poliinsaturados, oxidabilidad ${fixed(n.oxidisability, 1)} (se vigila a partir de ${plain(n.limit)} % o de ${plain(n.oxidisabilityLimit, 1)}): se enrancia pronto. ${n.protection === '' ? 'No contiene nada que lo retrase.' : `Lo retrasa: ${n.protection}.`}`,
    action:
      n.protection === ''
        ? 'Almacene por poco tiempo, en lugar fresco y oscuro. Pregunte a quien formula por un antioxidante y un agente quelante.'
        : 'No lo omita. Almacene por poco tiempo, en lugar fresco y oscuro.',
  }),
  'rapeseed-share': (n) => ({
    text: `El aceite de colza de bajo contenido de ácido erúcico es el ${plain(n.share, 1)} % de las grasas. Quienes elaboran jabón lo mantienen en ${plain(n.limit)} a ${plain(n.most)} % o menos: por encima, las pastillas quedan blandas y se enrancian.`,
    action:
      'Vigile en las pastillas almacenadas las manchas anaranjadas y el olor, y venda primero las más antiguas.',
  }),
  'castor-share': (n) => ({
    text: `El aceite de ricino es el ${plain(n.share, 1)} % de las grasas. Por encima de ${plain(n.limit)} % las pastillas se vuelven pegajosas.`,
    action: 'Déjelo más tiempo en el molde y seque las pastillas separadas unas de otras.',
  }),
  'strips-skin': (n) => ({
    text: `Los ácidos láurico y mirístico son el ${fixed(n.share, 0)} % de los ácidos, más de ${plain(n.limit)} %: un jabón así quita a la piel su propia grasa. Sobreengrasado ${plain(n.superfat, 1)} %.`,
    action: 'Adviértalo a quien tenga la piel seca o con heridas; no es para la cara.',
  }),
  'hard-and-brittle': (n) => ({
    text: `El ácido láurico es el ${fixed(n.lauric, 0)} % de los ácidos, más de ${plain(n.limit)} %: la pastilla endurece mucho y se rompe si se corta fría.`,
    action: 'Corte mientras esté tibio y blando, con guantes, o vierta en moldes individuales.',
  }),
  'allergen-sources': (n) => ({
    text: `De fuentes conocidas de alérgenos: ${n.sources}.`,
    action:
      'Avise a toda persona con alergia que esté en el puesto de trabajo. Nómbrelas en la etiqueta, haga este lote el último y lave después los utensilios.',
  }),
};
