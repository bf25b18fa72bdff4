import type { Outcome } from '../../physics/outcome';
import type { Transmission } from '../../physics/passages/transmission';
import { figure } from '../figures';
import { quantityInput } from '../inputs';
import { propagate } from '../propagate';
import { plainNumber } from '../quantity';
import { citation, explainReason } from '../reasons';
import { exact } from '../tolerance';
import type { Figure, Quantity, Value } from '../values';

/** The member that every passage has: its free-molecular transmission probability, with the tolerances of its inputs and method. */
export function transmissionFigure(
  inputs: readonly Quantity[],
  run: (...inputs: readonly number[]) => Outcome<Transmission>,
  assumptions: readonly string[] = [],
): readonly [string, Figure] {
  const { result, leans } = propagate<Outcome<Transmission>>({
    inputs,
    run: (numbers, factors) => scaled(run(...numbers), factors),
    errorsOf: (outcome) => (outcome.ok ? [outcome.value.error] : []),
    valuesOf: (outcome) => (outcome.ok ? new Map([[NAME, outcome.value.value]]) : new Map()),
  });
  if (!result.ok) return [NAME, { kind: 'absent', why: explainReason(result.reason) }];
  const { value, method, sources } = result.value;
  return [
    NAME,
    figure(
      { ...plainNumber(value), leans: leans.get(NAME) ?? exact, quantityKind: 'number' },
      { method: `free-molecular: ${method}`, sources: sources.map(citation), assumptions },
    ),
  ];
}

const NAME = 'transmission_probability';

/** How the walls reflect: as given, or wholly diffusely. */
export function accommodationOf(inputs: ReadonlyMap<string, Value>): Quantity {
  return quantityInput(inputs, 'accommodation') ?? plainNumber(1);
}

/** What is taken for granted about the walls. */
export function wallAssumptions(inputs: ReadonlyMap<string, Value>): readonly string[] {
  return inputs.has('accommodation') ? [] : ['wholly diffuse walls (no accommodation given)'];
}

function scaled(outcome: Outcome<Transmission>, factors: ReadonlyMap<string, number>): Outcome<Transmission> {
  if (!outcome.ok) return outcome;
  const factor = factors.get(outcome.value.error.key) ?? 1;
  return { ...outcome, value: { ...outcome.value, value: outcome.value.value * factor } };
}
