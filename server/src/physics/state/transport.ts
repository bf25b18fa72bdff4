import type { Composition } from '../composition';
import type { Outcome } from '../outcome';
import { all, map, map2, success } from '../outcome';
import { diffusionInMixture, diffusionMethod, pairDiffusion, selfDiffusivity } from '../transport/diffusion';
import { mixtureConductivity } from '../transport/mixtureConductivity';
import { mixtureViscosity } from '../transport/mixtureViscosity';
import type { Pairs } from '../transport/pairs';
import { pairsOf } from '../transport/pairs';
import type { StatePoint } from './closure';
import type { Trial } from './request';
import { factor } from './request';
import type { SpeciesAlone } from './speciesAlone';

/** How a gas carries momentum, heat and molecules. */
export interface Transport {
  /** Pa s. */
  readonly viscosity: Outcome<number>;
  /** W/(m K). */
  readonly conductivity: Outcome<number>;
  /** Of each species within the gas, or of itself where it is the only one, m²/s. */
  readonly diffusivities: readonly Outcome<number>[];
}

/** One species keeps its own values; several need what their molecules do to each other. */
export function transportOf(
  alone: readonly SpeciesAlone[],
  composition: Composition,
  point: StatePoint,
  trial: Trial,
): Transport {
  const [only, second] = alone;
  return only !== undefined && second === undefined
    ? ofOne(only, point, trial)
    : ofMany(alone, composition, point, trial);
}

function ofOne(one: SpeciesAlone, { numberDensity, temperature }: StatePoint, trial: Trial): Transport {
  const diffusivity = map(one.viscosity, (eta) => {
    return factor(trial, 'self_diffusion') * selfDiffusivity(one.species, eta, numberDensity, temperature);
  });
  return { viscosity: one.viscosity, conductivity: one.conductivity, diffusivities: [diffusivity] };
}

function ofMany(alone: readonly SpeciesAlone[], composition: Composition, point: StatePoint, trial: Trial): Transport {
  const { moleFractions: x } = composition;
  const molarMass = composition.species.map((species) => species.molarMass.value);
  const viscosities = all(alone.map((one) => one.viscosity));
  const conductivities = all(alone.map((one) => one.conductivity));
  const known = alone.map(({ viscosity }) => (viscosity.ok ? viscosity.value : undefined));
  const pairs = pairsOf(composition.species, known, point.temperature);
  const rows = diffusionRows(pairs, composition, point.temperature, trial);
  const matrix = allRows(rows);
  return {
    viscosity: map(viscosities, (eta) => {
      return factor(trial, 'mixture_viscosity') * mixtureViscosity(x, molarMass, eta, pairs);
    }),
    conductivity: map2(map2(viscosities, conductivities, both), matrix, (own, diffusion) => {
      const [viscosity, conductivity] = own;
      const mixture = { x, molarMass, viscosity, conductivity, pairs, diffusion };
      return factor(trial, 'mixture_conductivity') * mixtureConductivity(mixture);
    }),
    diffusivities: rows.map((row, i) => map(row, (values) => diffusionInMixture(i, x, values) / point.numberDensity)),
  };
}

/** n Dᵢⱼ of every pair, row by row. */
function diffusionRows(
  pairs: Pairs,
  { species }: Composition,
  T: number,
  trial: Trial,
): readonly Outcome<readonly number[]>[] {
  return species.map((one, i) =>
    all(
      species.map((other, j) => {
        const scale = factor(trial, diffusionMethod(one, other, T));
        return map(pairDiffusion(i, j, species, pairs, T), (value) => scale * value);
      }),
    ),
  );
}

function allRows(rows: readonly Outcome<readonly number[]>[]): Outcome<readonly (readonly number[])[]> {
  const values: (readonly number[])[] = [];
  for (const row of rows) {
    if (!row.ok) return row;
    values.push(row.value);
  }
  return success(values);
}

function both<A, B>(a: A, b: B): readonly [A, B] {
  return [a, b];
}
