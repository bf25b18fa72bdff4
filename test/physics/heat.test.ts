import assert from 'node:assert/strict';
import { kelvin, pascal } from '../../server/src/physics/brands';
import type { Composition } from '../../server/src/physics/composition';
import { pure } from '../../server/src/physics/composition';
import { k, N_A, R } from '../../server/src/physics/constants';
import type { ConductedHeat, Conduction } from '../../server/src/physics/heat/conductHeat';
import { conductHeat } from '../../server/src/physics/heat/conductHeat';
import { heatNotes } from '../../server/src/physics/heat/heatNotes';
import { heatErrors } from '../../server/src/physics/heat/heatErrors';
import { jumpCoefficient } from '../../server/src/physics/heat/excess';
import type { HeatWalls } from '../../server/src/physics/heat/walls';
import { figures, gas, mixture, near, valueOf, whole } from '../support/gases';

interface Case {
  readonly of?: string | Composition;
  readonly pressure: number;
  readonly hot?: number;
  readonly cold?: number;
  readonly walls?: HeatWalls;
  readonly alpha?: readonly [number, number];
}

const plates: HeatWalls = { kind: 'plates', spacing: 2e-3, area: 0.03 };
const cylinders = (inner: number, outer: number, hot: 'inner' | 'outer' = 'inner'): HeatWalls => ({
  kind: 'cylinders',
  inner,
  outer,
  length: 0.4,
  hot,
});

function conductionOf({
  of = 'Ar',
  pressure,
  hot = 320,
  cold = 280,
  walls = plates,
  alpha = [1, 1],
}: Case): Conduction {
  return {
    composition: typeof of === 'string' ? pure(gas(of)) : of,
    hot: kelvin(hot),
    cold: kelvin(cold),
    pressure: pascal(pressure),
    walls,
    hotAccommodation: alpha[0],
    coldAccommodation: alpha[1],
  };
}

function heat(given: Case): ConductedHeat {
  return valueOf(conductHeat(conductionOf(given), { factors: new Map() }));
}

/** ∫ f dT by Simpson's rule, which the engine does not use. */
function integral(f: (T: number) => number, low: number, high: number): number {
  const panels = 200;
  const step = (high - low) / panels;
  let sum = f(low) + f(high);
  for (let i = 1; i < panels; i++) sum += (i % 2 === 0 ? 2 : 4) * f(low + i * step);
  return (sum * step) / 3;
}

describe('heat in free flight', () => {
  const pressure = 1e-11;

  it('is that of Knudsen, with the accommodation of each wall', () => {
    // Knudsen, Ann. Phys. 34, 593 (1911): q = α′ (γ+1)/(γ−1) √(R/(8πMT)) p ΔT with 1/α′ = 1/α₁ + 1/α₂ − 1.
    for (const of of ['He', 'Ar', 'Xe']) {
      for (const alpha of [
        [1, 1],
        [0.4, 0.9],
        [0.05, 0.3],
      ] as const) {
        const M = gas(of).molarMass.value;
        const law = (4 * Math.sqrt(R / (8 * Math.PI * M * 300)) * pressure * 40) / (1 / alpha[0] + 1 / alpha[1] - 1);
        near(heat({ of, pressure, alpha }).flux, law, 1e-11, of);
        near(heat({ of, pressure, alpha }).freeMolecularFlow, law * 0.03, 1e-12, of);
      }
    }
  });

  it('counts the energy inside the molecules', () => {
    for (const of of ['N2', 'CO2', 'H2O']) {
      const M = gas(of).molarMass.value;
      const energy = integral((T) => whole(figures(of, T), 'molar_heat_capacity_cp') - R / 2, 350, 400);
      const rate = pressure / Math.sqrt((2 * Math.PI * M * k * 375) / N_A) / N_A;
      near(heat({ of, pressure, hot: 400, cold: 350 }).flux, rate * energy, 1e-9, of);
    }
    // The same as with (γ+1)/(γ−1) where the heat capacity hardly changes.
    const gamma = whole(figures('N2', 300), 'heat_capacity_ratio');
    const law = ((gamma + 1) / (gamma - 1)) * Math.sqrt(R / (8 * Math.PI * gas('N2').molarMass.value * 300)) * pressure;
    near(heat({ of: 'N2', pressure, hot: 301, cold: 299 }).flux, 2 * law, 1e-6);
  });

  it('counts the ratio of the areas between cylinders', () => {
    // The energy balance of two coaxial diffuse walls: 1/α′ = 1/α₁ + (r₁/r₂)(1/α₂ − 1), as for radiation.
    const M = gas('Ar').molarMass.value;
    const diffuse = 4 * Math.sqrt(R / (8 * Math.PI * M * 300)) * pressure * 40;
    for (const [inner, outer] of [
      [0.03, 0.033],
      [0.01, 0.05],
      [1e-5, 0.01],
    ] as const) {
      for (const alpha of [
        [1, 1],
        [0.4, 0.9],
        [0.9, 0.05],
      ] as const) {
        const effective = 1 / (1 / alpha[0] + (inner / outer) * (1 / alpha[1] - 1));
        near(heat({ pressure, walls: cylinders(inner, outer), alpha }).flux, effective * diffuse, 1e-9);
      }
    }
  });

  it('is the sum over the species of a mixture', () => {
    const sum = 0.3 * heat({ of: 'He', pressure }).flux + 0.7 * heat({ of: 'N2', pressure }).flux;
    near(heat({ of: mixture({ He: 0.3, N2: 0.7 }), pressure }).flux, sum, 1e-10);
  });
});

describe('heat in the continuum', () => {
  const pressure = 1e15;

  it('is that of Fourier with the conductivity integrated between the walls', () => {
    for (const [of, cold, hot] of [
      ['Ar', 200, 600],
      ['N2', 250, 350],
      ['CO2', 280, 500],
    ] as const) {
      const lambda = integral((T) => whole(figures(of, T), 'thermal_conductivity'), cold, hot);
      near(heat({ of, pressure, hot, cold }).flux, lambda / 2e-3, 1e-8, of);
      near(heat({ of, pressure, hot, cold }).conductivity, lambda / (hot - cold), 1e-8, of);
    }
  });

  it('falls with the logarithm of the radii between cylinders', () => {
    const { conductivity, flow } = heat({ pressure, walls: cylinders(0.02, 0.06) });
    near(flow, (2 * Math.PI * 0.4 * conductivity * 40) / Math.log(3), 1e-12);
    near(heat({ pressure }).conductivity, conductivity, 1e-12);
  });

  it('is the continuum heat flow, exactly', () => {
    for (const walls of [plates, cylinders(0.03, 0.033), cylinders(1e-5, 0.01)]) {
      const { flow, continuumFlow } = heat({ pressure, walls, alpha: [0.5, 0.7] });
      near(flow, continuumFlow, 1e-12);
    }
  });

  it('of a mixture uses its own conductivity', () => {
    const of = mixture({ He: 0.5, Ar: 0.5 });
    near(
      heat({ of, pressure, hot: 301, cold: 299 }).conductivity,
      whole(figures(of, 300), 'thermal_conductivity'),
      1e-5,
    );
  });
});

describe('heat with jumps at the walls', () => {
  it('is that of Fourier over a gap longer by the jump lengths', () => {
    const { flux, conductivity, hotJump, coldJump, continuumFlow } = heat({ pressure: 3e4, alpha: [0.8, 0.5] });
    near(flux, continuumFlow / 0.03 / (1 + (hotJump + coldJump) / 2e-3), 1e-6);
    assert.ok(conductivity < whole(figures('Ar', 300), 'thermal_conductivity'));
  });

  it('jumps by the kinetic coefficient where walls are diffuse', () => {
    const state = figures('Ar', 300, 1e3);
    const speed = Math.sqrt((2 * k * 300) / (gas('Ar').molarMass.value / N_A));
    // The coefficient is that of λ = 15/4 (R/M) η, from which argon's own conductivity departs by little.
    const kinetic = (3.75 * R * whole(state, 'viscosity')) / gas('Ar').molarMass.value;
    const length = (jumpCoefficient * whole(state, 'viscosity') * speed) / 1e3;
    const found = heat({ pressure: 1e3, hot: 301, cold: 299 }).hotJump;
    near((found * kinetic) / whole(state, 'thermal_conductivity'), length, 1e-4);
  });

  it('departs from walls that mirror a part of the molecules by no more than 3.2 %', () => {
    // Barichello & Siewert, Eur. J. Appl. Math. 11, 353 (2000): BGK, diffuse–specular (from memory).
    const published = [
      [0.1, 21.45012],
      [0.3, 6.630514],
      [0.5, 3.629125],
      [0.7, 2.317534],
      [0.9, 1.570264],
      [1, 1.302716],
    ] as const;
    const diffuse = heat({ pressure: 1e3 }).hotJump;
    for (const [alpha, zeta] of published) {
      const ratio = heat({ pressure: 1e3, alpha: [alpha, 1] }).hotJump / diffuse;
      near(ratio, zeta / 1.302716, 0.032, `${alpha}`);
    }
  });
});

describe('heat over all Knudsen numbers', () => {
  const decades = Array.from({ length: 121 }, (_, i) => 10 ** (-5 + i / 10));
  const cases: readonly HeatWalls[] = [
    plates,
    cylinders(0.03, 0.0301),
    cylinders(0.03, 0.06),
    cylinders(1e-4, 0.01),
    cylinders(1e-6, 0.01),
  ];

  it('rises with the pressure, below both limits, and without a step or a kink', () => {
    for (const walls of cases) {
      for (const alpha of [
        [1, 1],
        [0.3, 0.8],
      ] as const) {
        const flows = decades.map((pressure) => heat({ pressure, walls, alpha }));
        const slopes = flows.slice(1).map(({ flow }, i) => Math.log(flow / (flows[i]?.flow ?? NaN)));
        for (const { flow, freeMolecularFlow, continuumFlow } of flows) {
          assert.ok(flow <= freeMolecularFlow * (1 + 1e-12) && flow <= continuumFlow * (1 + 1e-12));
        }
        slopes.forEach((slope, i) => {
          assert.ok(slope > -1e-12, `falls after ${decades[i]}`);
          if (i > 0) assert.ok(Math.abs(slope - (slopes[i - 1] ?? NaN)) < 0.016, `kink at ${decades[i]}: ${slope}`);
        });
      }
    }
  });

  it('does not mind which of two walls is the hot one', () => {
    for (const pressure of [1e-3, 1, 10, 1e3]) {
      near(heat({ pressure, alpha: [0.3, 0.9] }).flow, heat({ pressure, alpha: [0.9, 0.3] }).flow, 1e-14);
      const there = heat({ pressure, walls: cylinders(0.01, 0.03, 'inner'), alpha: [0.3, 0.9] });
      const back = heat({ pressure, walls: cylinders(0.01, 0.03, 'outer'), alpha: [0.9, 0.3] });
      near(there.flow, back.flow, 1e-14);
      near(there.hotJump, back.coldJump, 1e-14);
    }
  });

  it('between cylinders of nearly one radius is that between plates', () => {
    const [radius, spacing] = [10, 1e-3];
    for (const pressure of [1e-3, 1, 10, 1e3]) {
      const between = heat({ pressure, walls: cylinders(radius, radius + spacing), alpha: [0.5, 0.8] });
      near(between.flux, heat({ pressure, walls: { kind: 'plates', spacing, area: 1 }, alpha: [0.5, 0.8] }).flux, 2e-4);
    }
  });

  it('lies below the sum of the two resistances alone between plates, by up to 9 %', () => {
    // Sherman's interpolation 1/q = 1/q_fm + 1/q_c, which Lees's four moments give as well, jumps by 1.66 instead of 1.954.
    const ratios = decades.map((pressure) => {
      const { flow, freeMolecularFlow, continuumFlow } = heat({ pressure });
      return flow * (1 / freeMolecularFlow + 1 / continuumFlow);
    });
    assert.ok(ratios.every((ratio) => ratio <= 1 + 1e-12));
    const least = Math.min(...ratios);
    assert.ok(least > 0.91 && least < 0.93, `${least}`);
  });

  it('takes the Knudsen number on the distance of the walls', () => {
    near(valueOf(heat({ pressure: 5 }).knudsen), whole(figures('Ar', 300, 5), 'mean_free_path') / 2e-3, 1e-12);
    const walls = cylinders(0.02, 0.025);
    near(valueOf(heat({ pressure: 5, walls }).knudsen), whole(figures('Ar', 300, 5), 'mean_free_path') / 5e-3, 1e-12);
  });

  it('moves with the error of the method only between its limits', () => {
    const trial = { factors: new Map([['heat_transition', 1.02]]) };
    const ratio = (pressure: number) =>
      valueOf(conductHeat(conductionOf({ pressure }), trial)).flux / heat({ pressure }).flux;
    near(ratio(1e-9), 1, 1e-9);
    near(ratio(1e12), 1, 1e-9);
    const moved = Math.max(...decades.map((pressure) => Math.abs(1 - ratio(pressure))));
    assert.ok(moved > 0.018 && moved <= 0.02, `${moved}`);
  });

  it('tells the errors of the data at their largest between the walls', () => {
    const errors = heatErrors(conductionOf({ of: 'N2', pressure: 1, hot: 300, cold: 4 }));
    const of = (key: string) => errors.find((error) => error.key === key)?.relative;
    assert.ok((of('conductivity:N2') ?? 0) >= 0.1);
    assert.ok(of('heat_transition') === 0.02 && of('second_virial') === undefined);
  });

  it('remarks on the gas at the cold wall', () => {
    const { cold, hot } = heatNotes(conductionOf({ of: 'N2', pressure: 1e3, hot: 300, cold: 20 }));
    assert.ok(cold.some(({ kind }) => kind === 'condensing'));
    assert.ok(!hot.some(({ kind }) => kind === 'condensing'));
  });

  it('says why there is no heat', () => {
    const swapped = conductHeat(conductionOf({ pressure: 1, hot: 280, cold: 320 }), { factors: new Map() });
    assert.ok(!swapped.ok && swapped.reason.kind === 'not-positive');
  });
});
