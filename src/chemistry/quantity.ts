declare const unit: unique symbol;

/** A number that carries its unit in its type, so that a mass cannot stand where a ratio is due. */
export type Quantity<Unit extends string> = number & { readonly [unit]: Unit };

export type Grams = Quantity<'g'>;
export type Moles = Quantity<'mol'>;
export type GramsPerMole = Quantity<'g/mol'>;
export type MolesPerGram = Quantity<'mol/g'>;
/** A part of a whole, 0..1 (never percent inside the core). */
export type Fraction = Quantity<'1'>;
export type Celsius = Quantity<'degC'>;
/** Saponification or acid value: mg of potassium hydroxide per g of fat (ISO 3657, ISO 660). */
export type MgKohPerGram = Quantity<'mg KOH/g'>;
/** Iodine value: g of iodine per 100 g of fat (ISO 3961). */
export type IodineValue = Quantity<'g I2/100 g'>;
export type GramsPerMillilitre = Quantity<'g/mL'>;

export const grams = (x: number) => x as Grams;
export const moles = (x: number) => x as Moles;
export const gramsPerMole = (x: number) => x as GramsPerMole;
export const molesPerGram = (x: number) => x as MolesPerGram;
export const fraction = (x: number) => x as Fraction;
export const celsius = (x: number) => x as Celsius;
export const mgKohPerGram = (x: number) => x as MgKohPerGram;
export const iodineValue = (x: number) => x as IodineValue;
export const gramsPerMillilitre = (x: number) => x as GramsPerMillilitre;

/** The value used, and the interval in which the true one is taken to lie. `low <= value <= high`. */
export interface Range<Q extends number> {
  readonly value: Q;
  readonly low: Q;
  readonly high: Q;
  /**
   * What the interval is: every value in it equally likely (a published or trade range, the default), or
   * the expanded uncertainty, k = 2, of a measured value.
   */
  readonly spread?: 'rectangular' | 'expanded';
}

/** Out of a model's range: names the rule that was left and the numbers that show it. */
export interface Breach {
  readonly rule: string;
  readonly numbers: Readonly<Record<string, number>>;
}

/** A result, or the reason why there is none. There is never a number outside a model's range. */
export type Outcome<T> =
  | { readonly ok: true; readonly value: T }
  | { readonly ok: false; readonly breach: Breach };

export const given = <T>(value: T): Outcome<T> => ({ ok: true, value });
export const refused = (
  rule: string,
  numbers: Readonly<Record<string, number>> = {},
): { readonly ok: false; readonly breach: Breach } => ({ ok: false, breach: { rule, numbers } });
