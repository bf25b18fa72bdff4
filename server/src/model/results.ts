import { statePropertyNamed } from '../physics/state/properties';

/** What a result is called and means, whatever computes it. */
export interface ResultDefinition {
  readonly name: string;
  readonly symbol?: string;
  /** Absent for words such as a regime. */
  readonly quantityKind?: string;
  /** The unit to show it in unless the file says otherwise, where the kind's usual one would mislead. */
  readonly unit?: string;
  readonly meaning: string;
}

/** What the results of the format mean. Symbols and kinds of the state properties are the engine's own. */
const meanings: Readonly<{ [name: string]: string | Omit<ResultDefinition, 'name'> }> = {
  pressure: 'the absolute pressure',
  temperature: 'the absolute temperature',
  partial_pressure: 'the pressure that the species would have alone',
  mole_fraction: 'the share of the molecules',
  mass_fraction: 'the share of the mass',
  number_density: 'molecules per volume',
  density: 'mass per volume',
  molar_mass: { symbol: 'M', quantityKind: 'molar_mass', meaning: 'mass per amount of substance' },
  mean_speed: 'the mean of the molecular speeds',
  rms_speed: 'the root of the mean square of the molecular speeds',
  most_probable_speed: 'the speed at the peak of the Maxwell distribution',
  sound_speed: 'the speed of sound of low frequency',
  heat_capacity_cp: 'at constant pressure, per mass',
  heat_capacity_cv: 'at constant volume, per mass',
  molar_heat_capacity_cp: 'at constant pressure, per amount',
  molar_heat_capacity_cv: 'at constant volume, per amount',
  heat_capacity_ratio: 'the isentropic exponent of the ideal gas',
  mean_free_path: 'from the viscosity: the path that Knudsen numbers and rarefied-flow theory use',
  mean_free_path_hard_sphere: 'between collisions of hard spheres of the collision diameter',
  collision_diameter: 'the diameter of hard spheres that have the viscosity of the gas',
  collision_frequency: 'how often one molecule collides, as hard spheres',
  mean_spacing: 'the edge of the cube that one molecule has on average',
  viscosity: 'the dynamic viscosity of the dilute gas',
  kinematic_viscosity: 'the viscosity per density',
  thermal_conductivity: 'of the dilute gas',
  thermal_diffusivity: 'how fast warmth spreads',
  diffusivity: 'of the gas in itself; of a species in the mixture',
  prandtl: 'how fast momentum spreads against warmth',
  schmidt: 'how fast momentum spreads against molecules',
  lewis: 'how fast warmth spreads against molecules',
  impingement_rate: 'molecules that strike a wall (Hertz–Knudsen)',
  mass_flux: 'the mass that strikes a wall',
  monolayer_time: 'how long a clean surface takes to be covered if every molecule stays',
  compressibility_factor: 'the molar volume against that of the ideal gas, from the second virial coefficient',
  second_virial: {
    symbol: 'B',
    quantityKind: 'molar_volume',
    unit: 'cm³/mol',
    meaning: 'how pairs of molecules bend the gas away from the ideal-gas law, Z = 1 + Bp/(RT)',
  },
  saturation_pressure: 'the pressure at which the vapour would be in equilibrium with its liquid or solid',
  condensation_margin:
    'saturation pressure over partial pressure: above 1 the vapour is dry, below 1 it condenses or freezes',
  dew_point: 'the temperature to which the gas may cool until this vapour condenses or freezes',
  thermal_wavelength: 'the de Broglie wavelength of thermal motion',
  mean_kinetic_energy: 'of the translation of one molecule',
  mach: { symbol: 'Ma', quantityKind: 'number', meaning: 'the speed of the stream against that of sound' },
  speed: { symbol: 'u', quantityKind: 'speed', meaning: 'the speed of the stream' },
  bore: { symbol: 'd', quantityKind: 'length', meaning: 'the inner diameter' },
  width: { symbol: 'b', quantityKind: 'length', meaning: 'the width across the flow' },
  height: { symbol: 'h', quantityKind: 'length', meaning: 'the height across the flow' },
  inner: { quantityKind: 'length', meaning: 'the outer diameter of the inner cylinder' },
  outer: { quantityKind: 'length', meaning: 'the inner diameter of the outer cylinder' },
  inlet_bore: { quantityKind: 'length', meaning: 'the diameter where the gas enters' },
  outlet_bore: { quantityKind: 'length', meaning: 'the diameter where it leaves' },
  diameter: { symbol: 'd', quantityKind: 'length', meaning: 'the diameter' },
  mass: { symbol: 'm', quantityKind: 'mass', meaning: 'volume times density' },
  length: { symbol: 'L', quantityKind: 'length', meaning: 'the length along the axis' },
  spacing: { symbol: 'h', quantityKind: 'length', meaning: 'the distance of the walls' },
  inner_area: { quantityKind: 'area', meaning: 'the area of the inner wall' },
  outer_area: { quantityKind: 'area', meaning: 'the area of the outer wall' },
  thickness: { symbol: 't', quantityKind: 'length', meaning: 'the thickness of the wall' },
  area: { symbol: 'A', quantityKind: 'area', meaning: 'the area of the section' },
  outlet_area: { quantityKind: 'area', meaning: 'the area of the section where the gas leaves' },
  volume: { symbol: 'V', quantityKind: 'volume', meaning: 'the volume inside' },
  wall_area: { symbol: 'S', quantityKind: 'area', meaning: 'the area of the walls' },
  hydraulic_diameter: { symbol: 'd_h', quantityKind: 'length', meaning: 'four times the section over its rim' },
  characteristic_length: {
    symbol: 'ℓ',
    quantityKind: 'length',
    meaning: 'the length that the Knudsen number is taken on',
  },
  aspect_ratio: {
    symbol: 'L/d',
    quantityKind: 'number',
    meaning: 'the length against the bore, or against the smaller size across',
  },
  transmission_probability: {
    symbol: 'W',
    quantityKind: 'number',
    meaning: 'the chance of a molecule to get through, free-molecular',
  },
  knudsen: { symbol: 'Kn', quantityKind: 'number', meaning: 'the mean free path against the characteristic length' },
  rarefaction: {
    symbol: 'δ',
    quantityKind: 'number',
    meaning: 'the rarefaction parameter a·p/(η·√(2kT/m)), with the radius or the gap as a',
  },
  regime: { meaning: 'viscous, slip, transitional or molecular, by the Knudsen number' },
  molecules: { symbol: 'N', quantityKind: 'number', meaning: 'the molecules inside' },
  wall_collision_rate: {
    symbol: 'Ż',
    quantityKind: 'frequency',
    meaning: 'how many molecules strike the walls per time',
  },
  heat_flux: {
    symbol: 'q',
    quantityKind: 'heat_flux',
    meaning: 'the heat per time and area through the gas; in a jacket, at the inner wall',
  },
  heat_flow: { symbol: 'Q̇', quantityKind: 'power', meaning: 'the heat per time from the hot wall to the cold one' },
  conductivity: {
    symbol: 'λ_eff',
    quantityKind: 'thermal_conductivity',
    meaning: 'the conductivity that a gas without jumps at the walls would need for the same heat',
  },
  jump_length_hot: {
    symbol: 'g_h',
    quantityKind: 'length',
    meaning: 'the length of gas that resists as the jump of temperature at the hot wall does',
  },
  jump_length_cold: {
    symbol: 'g_c',
    quantityKind: 'length',
    meaning: 'the length of gas that resists as the jump of temperature at the cold wall does',
  },
  free_molecular_heat_flow: {
    quantityKind: 'power',
    meaning: 'the heat flow if no molecule met another: the limit at low pressure',
  },
  continuum_heat_flow: {
    quantityKind: 'power',
    meaning: 'the heat flow by Fourier’s law, without jumps at the walls: the limit at high pressure',
  },
  conductance: {
    symbol: 'C',
    quantityKind: 'conductance',
    meaning: 'throughput per pressure difference, for small differences about this pressure',
  },
  poiseuille_coefficient: {
    symbol: 'G_P',
    quantityKind: 'number',
    meaning: 'the reduced flow that a pressure gradient drives',
  },
  thermal_creep_coefficient: {
    symbol: 'G_T',
    quantityKind: 'number',
    meaning: 'the reduced flow that a temperature gradient drives, towards the hot end',
  },
  slip_factor: {
    symbol: 'C_c',
    quantityKind: 'number',
    meaning: 'how many times less the drag is than by Stokes’ law (Cunningham)',
  },
  relaxation_time: {
    symbol: 'τ',
    quantityKind: 'time',
    meaning: 'how long the particle takes to take on the motion of the gas',
  },
  settling_speed: { symbol: 'v_s', quantityKind: 'speed', meaning: 'the steady speed of its fall' },
  stopping_distance: {
    symbol: 's',
    quantityKind: 'length',
    meaning: 'how far it gets into gas at rest at the speed of the state',
  },
  throughput: {
    symbol: 'q',
    quantityKind: 'throughput',
    meaning: 'pressure times volume per time, at the temperature of the gas',
  },
  molar_flow: { symbol: 'ṅ', quantityKind: 'amount_flow', unit: 'mol/s', meaning: 'amount of gas per time' },
  mass_flow: { symbol: 'ṁ', quantityKind: 'mass_flow', meaning: 'mass of gas per time' },
  molecule_flow: { symbol: 'Ṅ', quantityKind: 'molecule_flow', meaning: 'molecules per time' },
  standard_flow: {
    symbol: 'q_n',
    quantityKind: 'amount_flow',
    unit: 'sccm',
    meaning: 'amount of gas per time, in standard volume',
  },
};

const definitions: ReadonlyMap<string, ResultDefinition> = new Map(
  Object.entries(meanings).map(([name, entry]) => [name, definitionOf(name, entry)]),
);

export const results: readonly ResultDefinition[] = [...definitions.values()];

export function resultNamed(name: string): ResultDefinition | undefined {
  return definitions.get(name);
}

function definitionOf(name: string, entry: string | Omit<ResultDefinition, 'name'>): ResultDefinition {
  if (typeof entry !== 'string') return { name, ...entry };
  const property = statePropertyNamed(name);
  return property
    ? { name, symbol: property.symbol, quantityKind: property.quantityKind, meaning: entry }
    : { name, meaning: entry };
}
