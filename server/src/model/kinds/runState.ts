import { kelvin, kilogramPerCubicMetre, pascal, perCubicMetre } from '../../physics/brands';
import type { Composition } from '../../physics/composition';
import type { Outcome } from '../../physics/outcome';
import { solveState } from '../../physics/state/closure';
import type { Figure as EngineFigure, StateFigures } from '../../physics/state/evaluateState';
import { evaluateState } from '../../physics/state/evaluateState';
import { quantityInput } from '../inputs';
import type { Propagated } from '../propagate';
import { propagate } from '../propagate';
import type { Scope } from '../scope';
import { movableGas } from '../statedGas';
import { exact } from '../tolerance';
import type { Gas, Value } from '../values';

/** Runs the engine on the inputs, with every uncertain input and every model error carried through. */
export function runState(
  inputs: ReadonlyMap<string, Value>,
  gas: Gas,
  scope: Scope,
): Propagated<Outcome<StateFigures>> {
  const siteDensity = scope.condition('site_density');
  const point = POINT.map((name) => quantityInput(inputs, name));
  const diameter = quantityInput(inputs, 'collision_diameter');
  const movable = movableGas(gas);
  const absent = { si: NaN, leans: exact };
  return propagate<Outcome<StateFigures>>({
    inputs: [...point.map((value) => value ?? absent), diameter ?? absent, siteDensity, ...movable.inputs],
    run: ([p, T, n, rho, d, sites, ...ofGas], factors) => {
      return stateAt(movable.compositionAt(ofGas), { p, T, n, rho, d, sites }, factors);
    },
    errorsOf: (result) => (result.ok ? result.value.modelErrors : []),
    valuesOf: (result) => (result.ok ? numbersOf(result.value) : new Map()),
  });
}

const POINT = ['pressure', 'temperature', 'number_density', 'density'] as const;

interface Numbers {
  readonly p: number | undefined;
  readonly T: number | undefined;
  readonly n: number | undefined;
  readonly rho: number | undefined;
  readonly d: number | undefined;
  readonly sites: number | undefined;
}

function stateAt(
  composition: Composition,
  { p, T, n, rho, d, sites }: Numbers,
  factors: ReadonlyMap<string, number>,
): Outcome<StateFigures> {
  const point = solveState(composition, {
    ...(isGiven(p) ? { pressure: pascal(p) } : {}),
    ...(isGiven(T) ? { temperature: kelvin(T) } : {}),
    ...(isGiven(n) ? { numberDensity: perCubicMetre(n) } : {}),
    ...(isGiven(rho) ? { density: kilogramPerCubicMetre(rho) } : {}),
  });
  if (!point.ok) return point;
  const request = {
    composition,
    point: point.value,
    siteDensity: sites ?? NaN,
    ...(isGiven(d) ? { collisionDiameter: d } : {}),
  };
  return { ok: true, value: evaluateState(request, { factors }), notes: [] };
}

function isGiven(value: number | undefined): value is number {
  return value !== undefined && !Number.isNaN(value);
}

function numbersOf({ mixture, species }: StateFigures): ReadonlyMap<string, number> {
  const numbers = new Map<string, number>();
  const collect = (prefix: string, figures: ReadonlyMap<string, Outcome<EngineFigure>>) => {
    for (const [name, outcome] of figures) if (outcome.ok) numbers.set(prefix + name, outcome.value.value);
  };
  collect('', mixture);
  for (const [formula, figures] of species) collect(`${formula}.`, figures);
  return numbers;
}
