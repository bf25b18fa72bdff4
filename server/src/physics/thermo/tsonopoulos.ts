import { R } from '../constants';
import type { Species } from '../species/species';
import { isStated } from '../species/species';

/**
 * Second virial coefficients by the correlation of Tsonopoulos 1974 with the critical constants: for gases whose molecules do
 * not associate, within some 5 cm³/mol at room temperature if they are small.
 */

/** The critical constants at which the correlation is to be taken, for one species or for a pair. */
export interface Corresponding {
  /** K. */
  readonly temperature: number;
  /** Pa. */
  readonly pressure: number;
  readonly acentric: number;
  /** The coefficients of the polar term. */
  readonly a: number;
  readonly b: number;
}

/** B, m³/mol: B p_c/(R T_c) = f₀ + ω f₁ + a T_r⁻⁶ − b T_r⁻⁸ (Tsonopoulos 1974, eqs. 3, 4, 20 and 21; the numbers from memory). */
export function tsonopoulosVirial({ temperature, pressure, acentric, a, b }: Corresponding, T: number): number {
  const u = temperature / T;
  const u2 = u * u;
  const u3 = u2 * u;
  const u6 = u3 * u3;
  const u8 = u6 * u2;
  const simple = 0.1445 - 0.33 * u - 0.1385 * u2 - 0.0121 * u3 - 0.000607 * u8;
  const acentricPart = 0.0637 + 0.331 * u2 - 0.423 * u3 - 0.008 * u8;
  return ((R * temperature) / pressure) * (simple + acentric * acentricPart + a * u6 - b * u8);
}

/** The constants of one species at a temperature in K, if its critical point is known. */
export function correspondingOf(species: Species, T: number): Corresponding | undefined {
  const quantum = isStated(species) ? undefined : quantumGases.get(species.formula);
  if (quantum !== undefined) return effective(quantum, species.molarMass.value, T);
  const critical = species.critical?.value;
  return critical && { ...critical, ...polarTerm(species, critical.temperature, critical.pressure) };
}

/** Whether a gas is so light that its critical constants depend on temperature here. */
export function isQuantumGas(species: Species): boolean {
  return !isStated(species) && quantumGases.has(species.formula);
}

/**
 * The constants of a pair (Tsonopoulos 1974, eqs. 24 to 27; Prausnitz, Lichtenthaler & Gomes de Azevedo 1999, section 5.7).
 * The critical volumes follow from Z_c = 0.291 − 0.08 ω, and the temperature falls short of the geometric mean
 * as the sizes differ (Chueh & Prausnitz 1967). The polar term counts only between two polar molecules.
 */
export function correspondingOfPair(one: Corresponding, other: Corresponding): Corresponding {
  const volumes = [one, other].map(criticalVolume);
  const [v1 = 0, v2 = 0] = volumes;
  const mean = ((Math.cbrt(v1) + Math.cbrt(v2)) / 2) ** 3;
  const temperature = (Math.sqrt(one.temperature * other.temperature) * Math.sqrt(v1 * v2)) / mean;
  const acentric = (one.acentric + other.acentric) / 2;
  const pressure = ((compressibility(one) + compressibility(other)) / 2) * ((R * temperature) / mean);
  const polar = one.a !== 0 && other.a !== 0;
  return {
    temperature,
    pressure,
    acentric,
    a: polar ? (one.a + other.a) / 2 : 0,
    b: polar ? (one.b + other.b) / 2 : 0,
  };
}

const compressibility = ({ acentric }: Corresponding) => 0.291 - 0.08 * acentric;

function criticalVolume(one: Corresponding): number {
  return (compressibility(one) * R * one.temperature) / one.pressure;
}

/** Classical critical constants: T, K, and p, Pa. */
interface QuantumGas {
  readonly temperature: number;
  readonly pressure: number;
}

const atmosphere = 101325;

/** Gunn, Chueh & Prausnitz 1966, table 1; from memory. Helium-3 and the other hydrogens follow the same rule by their mass. */
const quantumGases: ReadonlyMap<string, QuantumGas> = new Map([
  ['He', { temperature: 10.47, pressure: 6.67 * atmosphere }],
  ['H2', { temperature: 43.6, pressure: 20.2 * atmosphere }],
  ['D2', { temperature: 43.6, pressure: 20.1 * atmosphere }],
  ['Ne', { temperature: 45.5, pressure: 26.9 * atmosphere }],
]);

/** T_c = T_c⁰/(1 + 21.8 K/(M T)), p_c = p_c⁰/(1 + 44.2 K/(M T)) with M in g/mol (Gunn, Chueh & Prausnitz 1966, eqs. 5 and 6). */
function effective(gas: QuantumGas, molarMass: number, T: number): Corresponding {
  const reduced = 1e3 * molarMass * T;
  return {
    temperature: gas.temperature / (1 + 21.8 / reduced),
    pressure: gas.pressure / (1 + 44.2 / reduced),
    acentric: 0,
    a: 0,
    b: 0,
  };
}

/**
 * Polar molecules without hydrogen bonds: a = −2.14·10⁻⁴ μ_r − 4.308·10⁻²¹ μ_r⁸, b = 0, with μ_r = 10⁵ μ² p_c/T_c² in D, atm
 * and K (Tsonopoulos 1974, eq. 23). Water has constants of its own (table 6).
 */
function polarTerm(species: Species, Tc: number, pc: number): { readonly a: number; readonly b: number } {
  const { formula, dipoleMoment } = species;
  if (formula === 'H2O' && !isStated(species)) return { a: 0.0279, b: 0.0229 };
  if (dipoleMoment === undefined) return { a: 0, b: 0 };
  const moment = dipoleMoment.value / debye;
  const reduced = (1e5 * moment * moment * (pc / atmosphere)) / (Tc * Tc);
  return { a: -2.14e-4 * reduced - 4.308e-21 * reduced ** 8, b: 0 };
}

/** C m. */
const debye = 3.33564e-30;
