import type { Dimension } from './dimension';
import { coherentUnitText } from './dimension';
import type { Unit } from './parseUnit';
import { unitOf } from './parseUnit';

/** A kind of quantity in the sense of ISO 80000: what a number measures, beyond its dimension. */
export interface QuantityKind {
  /** As written after `display`. */
  readonly name: string;
  readonly title: string;
  readonly dimension: Dimension;
  /** The coherent SI unit that results are told in to other programs. */
  readonly unit: string;
  /** The units of the trade, the most usual first. */
  readonly usual: readonly string[];
  /** The units to choose from by size, ascending, when nobody asked for one. */
  readonly ladder: readonly string[];
  readonly meaning: string;
}

/** Where several kinds share a dimension, the most general one comes first. */
export const quantityKinds: readonly QuantityKind[] = [
  kind('number', '1', ['1'], 'a plain number, without unit'),
  kind('fraction', '1', ['%', 'ppm', 'ppb'], 'a part of a whole', { ladder: ['ppb', 'ppm', '%'] }),
  kind('angle', '1', ['°', 'rad', 'mrad'], 'a plane angle'),
  kind('length', 'm', ['mm', 'm', 'µm', 'in'], 'a length, a diameter or a distance', {
    ladder: ['pm', 'nm', 'µm', 'mm', 'm', 'km'],
  }),
  kind('area', 'm²', ['cm²', 'mm²', 'm²', 'in²'], 'the size of a surface or a section', {
    ladder: ['mm²', 'cm²', 'm²'],
  }),
  kind('permeability', 'm²', ['m²', 'µm²'], 'how easily a porous solid lets a viscous fluid through (Darcy)'),
  kind('volume', 'm³', ['L', 'm³', 'cm³', 'in³'], 'the volume of a vessel or a passage', {
    ladder: ['mm³', 'cm³', 'L', 'm³'],
  }),
  kind('time', 's', ['s', 'min', 'h', 'ms'], 'a duration', { ladder: ['ns', 'µs', 'ms', 's', 'min', 'h', 'd'] }),
  kind('frequency', '1/s', ['1/s', 'Hz', 'kHz'], 'events per time'),
  kind('molecule_flow', '1/s', ['1/s'], 'molecules per time'),
  kind('speed', 'm/s', ['m/s', 'km/s', 'mm/s', 'km/h'], 'distance per time', {
    ladder: ['nm/s', 'µm/s', 'mm/s', 'm/s'],
  }),
  kind('mass', 'kg', ['g', 'kg', 'mg', 'u'], 'a mass', { ladder: ['ng', 'µg', 'mg', 'g', 'kg'] }),
  kind('amount', 'mol', ['mol', 'mmol', 'lbmol'], 'an amount of substance', {
    ladder: ['nmol', 'µmol', 'mmol', 'mol', 'kmol'],
  }),
  kind('temperature', 'K', ['°C', 'K', '°F'], 'an absolute temperature', { ladder: ['K'] }),
  kind('temperature_difference', 'K', ['K', '°R'], 'how much warmer one thing is than another'),
  kind('pressure', 'Pa', ['mbar', 'Pa', 'Torr', 'mTorr', 'bar', 'atm', 'psi'], 'force per area, absolute', {
    ladder: ['nPa', 'µPa', 'mPa', 'Pa', 'kPa', 'MPa', 'GPa'],
  }),
  kind('force', 'N', ['N', 'mN', 'dyn'], 'a force', { ladder: ['pN', 'nN', 'µN', 'mN', 'N', 'kN', 'MN'] }),
  kind('energy', 'J', ['J', 'eV', 'meV', 'kJ', 'cal'], 'energy, work or heat', {
    ladder: ['meV', 'eV', 'keV', 'mJ', 'J', 'kJ', 'MJ'],
  }),
  kind(
    'throughput',
    'Pa·m³/s',
    ['mbar·L/s', 'Torr·L/s', 'Pa·m³/s', 'atm·cc/s'],
    'quantity of gas per time, as pressure times volume',
    {
      ladder: ['mbar·L/s'],
    },
  ),
  kind('power', 'W', ['W', 'mW', 'kW', 'BTU/h'], 'energy per time; a flow of heat', {
    ladder: ['nW', 'µW', 'mW', 'W', 'kW', 'MW'],
  }),
  kind(
    'outgassing_rate',
    'Pa·m³/(s·m²)',
    ['mbar·L/(s·cm²)', 'Torr·L/(s·cm²)', 'Pa·m³/(s·m²)'],
    'throughput of gas that a surface gives off, per area',
    {
      ladder: ['mbar·L/(s·cm²)'],
    },
  ),
  kind('heat_flux', 'W/m²', ['W/m²', 'mW/cm²', 'W/cm²'], 'heat per time and area', {
    ladder: ['mW/m²', 'W/m²', 'kW/m²'],
  }),
  kind('number_density', '1/m³', ['1/m³', '1/cm³'], 'molecules per volume'),
  kind('density', 'kg/m³', ['kg/m³', 'g/cm³', 'g/L'], 'mass per volume', { ladder: ['mg/m³', 'g/m³', 'kg/m³'] }),
  kind('molar_mass', 'kg/mol', ['g/mol', 'kg/mol', 'lb/lbmol'], 'mass per amount of substance', { ladder: ['g/mol'] }),
  kind('molar_volume', 'm³/mol', ['L/mol', 'cm³/mol', 'm³/mol'], 'volume per amount of substance', {
    ladder: ['cm³/mol', 'L/mol', 'm³/mol'],
  }),
  kind('amount_flow', 'mol/s', ['sccm', 'slm', 'mol/s', 'sccs'], 'amount of gas per time'),
  kind('mass_flow', 'kg/s', ['g/s', 'kg/h', 'mg/s', 'kg/s'], 'mass per time', {
    ladder: ['ng/s', 'µg/s', 'mg/s', 'g/s', 'kg/s'],
  }),
  kind('volume_flow', 'm³/s', ['L/s', 'm³/h', 'L/min', 'ft³/min'], 'volume per time'),
  kind('conductance', 'm³/s', ['L/s', 'm³/h', 'm³/s'], 'throughput of a passage per pressure difference', {
    ladder: ['µL/s', 'mL/s', 'L/s'],
  }),
  kind('pumping_speed', 'm³/s', ['L/s', 'm³/h', 'm³/s'], 'volume of gas that a pump takes per time', {
    ladder: ['L/s'],
  }),
  kind('viscosity', 'Pa·s', ['µPa·s', 'Pa·s', 'cP', 'µP'], 'dynamic viscosity', { ladder: ['µPa·s', 'mPa·s', 'Pa·s'] }),
  kind('diffusivity', 'm²/s', ['cm²/s', 'm²/s', 'mm²/s'], 'how fast one gas spreads in another'),
  kind('kinematic_viscosity', 'm²/s', ['mm²/s', 'm²/s', 'cm²/s'], 'dynamic viscosity per density'),
  kind('thermal_diffusivity', 'm²/s', ['mm²/s', 'm²/s', 'cm²/s'], 'how fast warmth spreads'),
  kind(
    'thermal_conductivity',
    'W/(m·K)',
    ['mW/(m·K)', 'W/(m·K)', 'cal/(s·cm·K)'],
    'heat flux per temperature gradient',
    {
      ladder: ['µW/(m·K)', 'mW/(m·K)', 'W/(m·K)'],
    },
  ),
  kind(
    'heat_capacity',
    'J/(kg·K)',
    ['J/(kg·K)', 'kJ/(kg·K)', 'J/(g·K)', 'cal/(g·K)'],
    'heat per mass and temperature rise',
  ),
  kind(
    'molar_heat_capacity',
    'J/(mol·K)',
    ['J/(mol·K)', 'cal/(mol·K)'],
    'heat per amount of substance and temperature rise',
  ),
  kind('impingement_rate', '1/(m²·s)', ['1/(m²·s)', '1/(cm²·s)'], 'molecules that strike a wall, per area and time'),
  kind('mass_flux', 'kg/(m²·s)', ['kg/(m²·s)', 'g/(m²·s)'], 'mass per area and time'),
  kind('site_density', '1/m²', ['1/m²', '1/cm²'], 'places for molecules on a surface, per area'),
  kind('electric_dipole', 'C·m', ['D', 'C·m'], 'electric dipole moment of a molecule'),
];

const byName = new Map(quantityKinds.map((each) => [each.name, each]));
const byDimension = groupByDimension();

export function kindNamed(name: string): QuantityKind | undefined {
  return byName.get(name);
}

/** The kinds that have this dimension, the most general first. */
export function kindsOf(of: Dimension): readonly QuantityKind[] {
  return byDimension.get(of) ?? [];
}

/** For messages: `a pressure`, or `a quantity in kg·m⁻³·s` where there is no name. */
export function describeDimension(of: Dimension): string {
  const [general] = kindsOf(of);
  return general ? withArticle(general) : `a quantity in ${coherentUnitText(of)}`;
}

/** What a unit is plainly for: W is a power and mbar·L/s a throughput, though they share a dimension. */
export function describeUnit(unit: Unit): string {
  const kinds = kindsOf(unit.dimension);
  const shared = kinds.map((each) => sharedRows(unit, each));
  const best = kinds[shared.indexOf(Math.max(...shared))];
  return best ? withArticle(best) : describeDimension(unit.dimension);
}

/** How many factors of the unit the trade uses for this kind. */
function sharedRows(unit: Unit, { usual }: QuantityKind): number {
  const rows = new Set(usual.flatMap((text) => unitOf(text).parts.map((part) => part.row)));
  return unit.parts.filter((part) => rows.has(part.row)).length;
}

function withArticle({ title }: QuantityKind): string {
  const words = title.toLowerCase();
  return `${/^[aeiou]/.test(words) ? 'an' : 'a'} ${words}`;
}

function groupByDimension(): Map<Dimension, QuantityKind[]> {
  const groups = new Map<Dimension, QuantityKind[]>();
  for (const each of quantityKinds) groups.set(each.dimension, [...(groups.get(each.dimension) ?? []), each]);
  return groups;
}

function kind(
  name: string,
  unit: string,
  usual: readonly [string, ...string[]],
  meaning: string,
  { ladder = [usual[0]] }: { ladder?: readonly string[] } = {},
): QuantityKind {
  const words = name.replaceAll('_', ' ');
  const title = words.charAt(0).toUpperCase() + words.slice(1);
  return { name, title, dimension: unitOf(unit).dimension, unit, usual, ladder, meaning };
}
