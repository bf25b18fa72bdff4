/** SI numbers that cannot be mixed up. Conversion from other units happens in `quantities` and nowhere else. */

declare const unit: unique symbol;

interface Unit<Name extends string> {
  readonly [unit]: Name;
}

export type Kelvin = number & Unit<'K'>;
export type Pascal = number & Unit<'Pa'>;
export type Metre = number & Unit<'m'>;
export type PerCubicMetre = number & Unit<'1/m3'>;
export type PerSquareMetre = number & Unit<'1/m2'>;
export type KilogramPerCubicMetre = number & Unit<'kg/m3'>;

export const kelvin = (value: number): Kelvin => value as Kelvin;
export const pascal = (value: number): Pascal => value as Pascal;
export const metre = (value: number): Metre => value as Metre;
export const perCubicMetre = (value: number): PerCubicMetre => value as PerCubicMetre;
export const perSquareMetre = (value: number): PerSquareMetre => value as PerSquareMetre;
export const kilogramPerCubicMetre = (value: number): KilogramPerCubicMetre => value as KilogramPerCubicMetre;
