import { solveState } from '../state/closure';
import type { ModelError } from '../state/modelErrors';
import { modelErrors } from '../state/modelErrors';
import { kelvin } from '../brands';
import type { Conduction } from './conductHeat';
import { transition, transitionError } from './conductHeat';

/** The errors behind conducted heat: of the gas data, at their largest between the walls, and of the method. */
export function heatErrors({ composition, hot, cold, pressure }: Conduction): readonly ModelError[] {
  const largest = new Map<string, number>([[transition, transitionError(composition)]]);
  for (const temperature of [cold, kelvin((hot + cold) / 2), hot]) {
    const point = solveState(composition, { temperature, pressure });
    if (!point.ok) continue;
    for (const { key, relative } of modelErrors({ composition, point: point.value, siteDensity: 1 })) {
      if (MOVING.test(key)) largest.set(key, Math.max(relative, largest.get(key) ?? 0));
    }
  }
  return [...largest].map(([key, relative]) => ({ key, relative }));
}

/** What moves a conductivity, a heat capacity or a free path; vapour curves and virial coefficients do not. */
const MOVING =
  /^(?:viscosity|conductivity|heat_capacity):|^(?:eucken|monatomic_conductivity)$|^mixture_|^(?:measured|pair|fuller)_/;
