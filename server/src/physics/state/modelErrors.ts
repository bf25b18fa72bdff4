import type { DiffusionMethod } from '../transport/diffusion';
import { diffusionMethod } from '../transport/diffusion';
import { measuredError } from '../transport/measuredDiffusion';
import type { Sourced } from '../sources';
import { conductionMethod } from '../transport/conductivity';
import type { Correlation } from '../transport/correlation';
import { heatCapacityRange } from '../thermo/heatCapacity';
import { dewPoint, saturationPressure } from '../thermo/saturation';
import { secondVirial, virialError } from '../thermo/virial';
import type { Species } from '../species/species';
import type { StateRequest } from './request';

/** A relative error, 95 %, of a correlation or a method; its key names it among the factors of a trial. */
export interface ModelError {
  readonly key: string;
  readonly relative: number;
}

/** Beyond the range of its data a correlation is taken to be uncertain by this much at least. */
const beyondRange = 0.1;

/** Of a correlation that states no uncertainty of its own. */
const unstated = 0.05;

/** The errors of the methods: our judgement from the comparisons that their sources print. */
const methodErrors = {
  eucken: 0.1,
  monatomic_conductivity: 0.005,
  mixture_viscosity: 0.03,
  mixture_conductivity: 0.05,
  self_diffusion: 0.04,
} as const;

/** Of a mixture, where a potential is missing. */
const withoutPotential = 0.06;

/** Every model error that stands behind the figures of a state. */
export function modelErrors({ composition, point }: StateRequest): ModelError[] {
  const { species } = composition;
  const errors = species.flatMap((one, i) => [
    ...correlationError('viscosity', one.formula, one.viscosity, point.temperature),
    ...correlationError('conductivity', one.formula, one.conductivity, point.temperature),
    ...heatError(one, point.temperature),
    ...saturationError(one, point.temperature, (composition.moleFractions[i] ?? 0) * point.pressure),
  ]);
  if (secondVirial(composition, point.temperature).ok) errors.push({ key: 'second_virial', relative: virialError });
  const conducting = species.filter((one) => one.viscosity !== undefined && one.heatCapacity !== undefined);
  const methods = new Set(conducting.map(conductionMethod));
  if (methods.has('monatomic')) errors.push(method('monatomic_conductivity'));
  if (methods.has('eucken')) errors.push(method('eucken'));
  if (1 < species.length) {
    const rough = species.some(({ lennardJones }) => lennardJones === undefined);
    errors.push(
      { key: 'mixture_viscosity', relative: rough ? withoutPotential : methodErrors.mixture_viscosity },
      { key: 'mixture_conductivity', relative: rough ? withoutPotential : methodErrors.mixture_conductivity },
      ...diffusionErrors(species, point.temperature),
    );
  } else {
    errors.push(method('self_diffusion'));
  }
  return errors.filter(isError);
}

/** Each way of finding the diffusion of a pair has its own error; among the estimates, those of polar molecules and of hard spheres are the worst. */
function diffusionErrors(species: readonly Species[], T: number): ModelError[] {
  const pairs = species.flatMap((one, i) => species.slice(0, i).map((other) => ({ one, other })));
  const found = new Map<DiffusionMethod, boolean>();
  for (const { one, other } of pairs) {
    const polar = [one, other].some(
      ({ dipoleMoment, lennardJones }) => dipoleMoment !== undefined || lennardJones === undefined,
    );
    const by = diffusionMethod(one, other, T);
    found.set(by, polar || (found.get(by) ?? false));
  }
  return [...found].map(([key, polar]) => ({ key, relative: diffusionError[key](polar) }));
}

const diffusionError: { readonly [method in DiffusionMethod]: (polar: boolean) => number } = {
  measured_diffusion: () => measuredError,
  pair_diffusion: (polar) => (polar ? 0.25 : 0.1),
  fuller_diffusion: () => 0.15,
};

function method(key: keyof typeof methodErrors): ModelError {
  return { key, relative: methodErrors[key] };
}

function correlationError(
  property: string,
  formula: string,
  data: Sourced<Correlation> | undefined,
  T: number,
): ModelError[] {
  if (data === undefined) return [];
  const stated = data.uncertainty ?? unstated;
  return [{ key: `${property}:${formula}`, relative: within(data.value, T) ? stated : Math.max(stated, beyondRange) }];
}

function heatError({ formula, heatCapacity }: Species, T: number): ModelError[] {
  if (heatCapacity === undefined || heatCapacity.uncertainty === 0) return [];
  const stated = heatCapacity.uncertainty ?? unstated;
  const inside = within(heatCapacityRange(heatCapacity.value), T);
  return [{ key: `heat_capacity:${formula}`, relative: inside ? stated : Math.max(stated, beyondRange) }];
}

/** Of the curve that the temperature lies on, or else the dew point; none where the vapour has neither. */
function saturationError(species: Species, T: number, pressure: number): ModelError[] {
  const dew = dewPoint(species, pressure);
  const place = saturationPressure(species, T).ok ? T : dew.ok ? dew.value : undefined;
  return place === undefined ? [] : saturationErrorAt(species, place);
}

/** Of the curve that a temperature lies on, K. */
export function saturationErrorAt({ formula, saturation = [] }: Species, T: number): ModelError[] {
  const curve = saturation.find(({ value }) => T < value.high) ?? saturation.at(-1);
  return [{ key: `saturation_pressure:${formula}`, relative: curve?.uncertainty ?? unstated }].filter(isError);
}

function isError({ relative }: ModelError): boolean {
  return 0 < relative;
}

function within({ low, high }: { readonly low: number; readonly high: number }, T: number): boolean {
  return low <= T && T <= high;
}
