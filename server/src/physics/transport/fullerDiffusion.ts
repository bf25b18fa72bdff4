import { k } from '../constants';
import type { Species } from '../species/species';
import { isStated } from '../species/species';

/**
 * n Dᵢⱼ of two species, 1/(m s), from the volumes of their atoms (Fuller, Schettler & Giddings 1966, in the form and with the
 * volumes of Poling, Prausnitz & O'Connell 2001, eq. 11-4.4 and table 11-1; from memory): the last resort where no potential is known.
 * Nothing where an atom is not in the table.
 */
export function fullerDiffusion(one: Species, other: Species, T: number): number | undefined {
  // The name that a file gives a molecule of its own is no formula.
  if (isStated(one) || isStated(other)) return undefined;
  const v1 = diffusionVolume(one.formula);
  const v2 = diffusionVolume(other.formula);
  if (v1 === undefined || v2 === undefined) return undefined;
  // Printed for D in cm²/s, p in bar and M in g/mol.
  const mass = 2e3 / (1 / one.molarMass.value + 1 / other.molarMass.value);
  const size = Math.cbrt(v1) + Math.cbrt(v2);
  const diffusivity = (1e-4 * 0.00143 * Math.pow(T, 1.75)) / (Math.sqrt(mass) * size * size);
  return (diffusivity * bar) / (k * T);
}

/** The diffusion volume of a molecule: measured, or the sum over its atoms. */
export function diffusionVolume(formula: string): number | undefined {
  const measured = molecules.get(formula);
  if (measured !== undefined) return measured;
  // A small letter in front tells isomers apart: nC4H10.
  const symbols = formula.replace(/^[a-z]/, '');
  if (!/^([A-Z][a-z]?\d*)+$/.test(symbols)) return undefined;
  let volume = aromatic.has(formula) ? aromaticRing : 0;
  for (const [, symbol = '', count] of symbols.matchAll(/([A-Z][a-z]?)(\d*)/g)) {
    const atom = atoms.get(symbol);
    if (atom === undefined) return undefined;
    volume += atom * Number(count === '' ? '1' : count);
  }
  return volume;
}

const bar = 1e5;

const atoms: ReadonlyMap<string, number> = new Map([
  ['C', 15.9],
  ['H', 2.31],
  ['O', 6.11],
  ['N', 4.54],
  ['F', 14.7],
  ['Cl', 21],
  ['Br', 21.9],
  ['I', 29.8],
  ['S', 22.9],
]);

const aromaticRing = -18.3;
const aromatic: ReadonlySet<string> = new Set(['C6H6', 'C7H8']);

const molecules: ReadonlyMap<string, number> = new Map([
  ['He', 2.67],
  ['Ne', 5.98],
  ['Ar', 16.2],
  ['Kr', 24.5],
  ['Xe', 32.7],
  ['H2', 6.12],
  ['D2', 6.84],
  ['N2', 18.5],
  ['O2', 16.3],
  ['air', 19.7],
  ['CO', 18],
  ['CO2', 26.9],
  ['N2O', 35.9],
  ['NH3', 20.7],
  ['H2O', 13.1],
  ['SF6', 71.3],
  ['Cl2', 38.4],
  ['Br2', 69],
  ['SO2', 41.8],
]);
