import type { Outcome } from '../../physics/outcome';
import { success } from '../../physics/outcome';
import type { Molecules, Section } from '../../physics/rarefied/kineticCoefficients';
import { kineticCoefficients, kineticErrors, kineticSources } from '../../physics/rarefied/kineticCoefficients';
import { endSources, longConductance } from '../../physics/rarefied/longConductance';
import { unitOf } from '../../quantities/parseUnit';
import { divide, multiply, power } from '../arithmetic';
import { figure } from '../figures';
import { quantityInput } from '../inputs';
import { propagate } from '../propagate';
import { plainNumber, quantity } from '../quantity';
import { citation, explainReason } from '../reasons';
import { resultNamed } from '../results';
import { exact } from '../tolerance';
import type { Figure, Members, Provenance, Quantity, Record } from '../values';
import { quantityOf } from './siteMembers';

/** How a gas at rest would flow through the tube or slit that it is in. */
export function passageMembers(state: Record, geometry: Record, rarefaction: Quantity): Members {
  const passage = passageOf(geometry);
  if (!passage) return geometry.word === 'orifice' ? thinWall : new Map();
  const pressure = quantityOf(state.members, 'pressure');
  const density = quantityOf(state.members, 'density');
  const meanSpeed = quantityOf(state.members, 'mean_speed');
  if (!pressure || !density || !meanSpeed) return new Map();

  const molecules = moleculesOf(state);
  const stated = quantityInput(geometry.inputs, 'accommodation');
  const transmission = quantityOf(geometry.members, 'transmission_probability');
  const thermalSpeed = power(divide(multiply(plainNumber(2), pressure), density), plainNumber(0.5));
  const { size, width, length, section } = passage;
  const { result, leans } = propagate<Outcome<Flow>>({
    inputs: [
      ...[rarefaction, size, width, length, stated ?? plainNumber(1), thermalSpeed, meanSpeed],
      transmission ?? plainNumber(NaN),
    ],
    run: ([delta, a, b, l, alpha, v0, c, w], factors) =>
      flowOf({ section, molecules, numbers: { delta, a, b, l, alpha, v0, c, w } }, factors),
    errorsOf: (outcome) => (outcome.ok ? outcome.value.errors : []),
    valuesOf: (outcome) => (outcome.ok ? outcome.value.values : new Map()),
  });

  const assumptions = [
    ...(stated ? [] : ['walls that reflect diffusely (no accommodation given)']),
    ...(molecules === 'mixture' ? ['a mixture that flows as one gas of its mean molar mass'] : []),
  ];
  const found = (name: Result, provenance: Provenance): [string, Figure] => [
    name,
    result.ok
      ? figure(shaped(name, result.value.values.get(name) ?? NaN, leans.get(name) ?? exact), provenance)
      : { kind: 'absent', why: explainReason(result.reason) },
  ];
  const kinetic = { method: KINETIC[section], sources: kineticSources.map(citation), assumptions };
  const inner = molecules === 'molecules' ? ['heat carried by the flight of molecules alone, as of atoms'] : [];
  return new Map([
    found('conductance', conductanceProvenance(section, transmission !== undefined, assumptions)),
    found('poiseuille_coefficient', kinetic),
    found('thermal_creep_coefficient', { ...kinetic, assumptions: [...assumptions, ...inner] }),
  ]);
}

type Result = 'conductance' | 'poiseuille_coefficient' | 'thermal_creep_coefficient';

const KINETIC: { readonly [section in Section]: string } = {
  tube: 'linearised kinetic equation in a long round tube, collision model of Shakhov, diffuse–specular walls',
  plates: 'linearised kinetic equation between parallel plates, collision model of Shakhov, diffuse–specular walls',
};

const thinWall: Members = new Map(
  ['poiseuille_coefficient', 'thermal_creep_coefficient'].map((name) => [
    name,
    { kind: 'absent', why: 'an orifice is too short for a flow to develop; a tube or a slit has this coefficient' },
  ]),
);

interface Passage {
  readonly section: Section;
  readonly size: Quantity;
  readonly width: Quantity;
  readonly length: Quantity;
}

function passageOf({ word, members }: Record): Passage | undefined {
  const length = quantityOf(members, 'length');
  const bore = quantityOf(members, 'bore');
  if (word === 'tube' && bore && length) {
    const radius = multiply(plainNumber(0.5), bore);
    return { section: 'tube', size: radius, width: radius, length };
  }
  const height = quantityOf(members, 'height');
  const width = quantityOf(members, 'width');
  return word === 'slit' && height && width && length ? { section: 'plates', size: height, width, length } : undefined;
}

function moleculesOf({ gas, members }: Record): Molecules {
  if (gas && gas.composition.species.length > 1) return 'mixture';
  const ratio = quantityOf(members, 'heat_capacity_ratio');
  return ratio && ratio.si > 1.66 ? 'atoms' : 'molecules';
}

interface Numbers {
  readonly [name: string]: number | undefined;
}

interface Flow {
  readonly values: ReadonlyMap<Result, number>;
  readonly errors: readonly { readonly key: string; readonly relative: number }[];
}

interface Trial {
  readonly section: Section;
  readonly molecules: Molecules;
  readonly numbers: Numbers;
}

function flowOf({ section, molecules, numbers }: Trial, factors: ReadonlyMap<string, number>): Outcome<Flow> {
  const { delta = NaN, a = NaN, b = NaN, l = NaN, alpha = NaN, v0 = NaN, c = NaN, w = NaN } = numbers;
  // No wall reflects more than all molecules diffusely, whatever the tolerance of its accommodation.
  const accommodation = Math.min(alpha, 1);
  const coefficients = kineticCoefficients(section, delta, accommodation);
  const conductance = longConductance({
    ...{ section, size: a, width: b, length: l, accommodation, rarefaction: delta, thermalSpeed: v0, meanSpeed: c },
    ...(Number.isNaN(w) ? {} : { transmission: w }),
  });
  if (!coefficients.ok) return coefficients;
  if (!conductance.ok) return conductance;
  const { poiseuille, thermalCreep } = coefficients.value;
  const errors = kineticErrors(coefficients.value, delta, molecules);
  const factor = (key: string) => factors.get(key) ?? 1;
  return success({
    values: new Map([
      ['conductance', conductance.value.conductance * factor('kinetic_model') * factor('end_correction')],
      ['poiseuille_coefficient', poiseuille * factor('kinetic_model')],
      ['thermal_creep_coefficient', thermalCreep * factor('kinetic_model_of_creep')],
    ]),
    errors: [
      { key: 'kinetic_model', relative: errors.poiseuille },
      { key: 'kinetic_model_of_creep', relative: errors.thermalCreep },
      { key: 'end_correction', relative: conductance.value.endsError },
    ],
  });
}

function conductanceProvenance(section: Section, withEnds: boolean, assumptions: readonly string[]): Provenance {
  const long = section === 'tube' ? 'C = π a³ v₀ G_P/(2L)' : 'C = b a² v₀ G_P/(2L)';
  return {
    method: withEnds
      ? `${long} with G_P from the kinetic equation; its ends from the transmission probability and from creeping flow`
      : `${long} with G_P from the kinetic equation`,
    sources: [...kineticSources, ...(withEnds ? [endSources[section]] : [])].map(citation),
    range: 'small differences of pressure about this one, laminar',
    assumptions: withEnds ? assumptions : [...assumptions, 'ends that do not matter'],
  };
}

function shaped(name: Result, si: number, leans: Quantity['leans']): Quantity {
  const quantityKind = resultNamed(name)?.quantityKind ?? 'number';
  const { dimension } = unitOf(name === 'conductance' ? 'm³/s' : '1');
  return { ...quantity(si, dimension, leans), quantityKind };
}
