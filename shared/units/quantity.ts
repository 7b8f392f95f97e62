/** A number that remembers its unit, so that inches cannot be handed to a function that wants psi. */
declare const unitBrand: unique symbol;
type Branded<Name extends string> = number & { readonly [unitBrand]: Name };

export type Inches = Branded<'in'>;
export type Feet = Branded<'ft'>;
export type Millimetres = Branded<'mm'>;
export type Psi = Branded<'psi'>;
export type Fahrenheit = Branded<'degF'>;
export type Celsius = Branded<'degC'>;
export type Degrees = Branded<'deg'>;
export type Minutes = Branded<'min'>;
export type Seconds = Branded<'s'>;
export type Volts = Branded<'V'>;
export type Amperes = Branded<'A'>;
export type Percent = Branded<'pct'>;

export const inches = (value: number): Inches => value as Inches;
export const feet = (value: number): Feet => value as Feet;
export const millimetres = (value: number): Millimetres => value as Millimetres;
export const psi = (value: number): Psi => value as Psi;
export const fahrenheit = (value: number): Fahrenheit => value as Fahrenheit;
export const celsius = (value: number): Celsius => value as Celsius;
export const degrees = (value: number): Degrees => value as Degrees;
export const minutes = (value: number): Minutes => value as Minutes;
export const seconds = (value: number): Seconds => value as Seconds;
export const volts = (value: number): Volts => value as Volts;
export const amperes = (value: number): Amperes => value as Amperes;
export const percent = (value: number): Percent => value as Percent;
