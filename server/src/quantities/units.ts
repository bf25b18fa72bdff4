import type { Dimension } from './dimension';
import { dimension, dimensionless, divideDimensions, multiplyDimensions, powerDimension } from './dimension';

export type UnitKind =
  /** A multiple of the coherent SI unit. */
  | 'plain'
  /** A temperature counted from its own zero. */
  | 'offset'
  /** A pressure above the ambient one. */
  | 'gauge'
  /** An amount of gas per time, told as the volume it has at standard conditions. */
  | 'standard-flow';

/** One unit, as a row. To add a unit, add a row. */
export interface UnitRow {
  /** The canonical spelling. */
  readonly symbol: string;
  /** Other spellings that mean exactly this unit. */
  readonly aliases: readonly string[];
  /** What people write who mean this unit; never read, only used to suggest the right spelling. */
  readonly words: readonly string[];
  /**
   * The number of coherent SI units in this unit, as exact decimals joined by `*` and `/`.
   * Of a standard flow it is the volume per time, in m³/s.
   */
  readonly factor: string;
  /** Kelvin at the zero of an offset unit. */
  readonly zero?: string;
  readonly dimension: Dimension;
  /** Which prefixes it takes, by their symbols. */
  readonly prefixes: 'all' | 'none' | readonly string[];
  readonly kind: UnitKind;
  /** Where the factor is defined. */
  readonly source: string;
  /** One line for hovers. */
  readonly meaning: string;
}

const length = dimension({ length: 1 });
const area = powerDimension(length, 2);
const volume = powerDimension(length, 3);
const mass = dimension({ mass: 1 });
const time = dimension({ time: 1 });
const current = dimension({ current: 1 });
const temperature = dimension({ temperature: 1 });
const amount = dimension({ amount: 1 });
const luminosity = dimension({ luminosity: 1 });
const perTime = powerDimension(time, -1);
const force = dimension({ mass: 1, length: 1, time: -2 });
const pressure = divideDimensions(force, area);
const energy = multiplyDimensions(force, length);
const power = divideDimensions(energy, time);
const charge = multiplyDimensions(current, time);
const voltage = divideDimensions(power, current);
const resistance = divideDimensions(voltage, current);
const magneticFlux = multiplyDimensions(voltage, time);
const dose = divideDimensions(energy, mass);
const amountFlow = divideDimensions(amount, time);

const brochure = 'SI Brochure, 9th edition (2019)';
const baseUnits = `${brochure}, table 2`;
const namedUnits = `${brochure}, table 4`;
const acceptedUnits = `${brochure}, table 8`;
const sp811 = 'NIST SP 811 (2008), appendix B.8';
const iyp = 'International yard and pound agreement (1959)';
const poundForce = `${iyp}; standard gravity of the 3rd CGPM (1901)`;
const debye = '1e-18 statC·cm, with the speed of light of the SI Brochure';
const codata = 'CODATA 2018';
const parts = `${brochure}, 5.4.7`;
const practice = 'common practice, no source';

const poundPerSquareInch = '0.45359237 * 9.80665 / 0.0254 / 0.0254';
const thousandUp = ['k', 'M', 'G'];
const small = ['m', 'µ', 'n', 'p'];

export const units: readonly UnitRow[] = [
  // SI base units
  row('m', '1', length, baseUnits, 'metre', { prefixes: 'all', words: ['meter', 'metre', 'meters', 'metres'] }),
  row('g', '1e-3', mass, baseUnits, 'gram, a thousandth of the kilogram', {
    prefixes: 'all',
    words: ['gram', 'grams'],
  }),
  row('s', '1', time, baseUnits, 'second', { prefixes: 'all', words: ['sec', 'secs', 'second', 'seconds'] }),
  row('A', '1', current, baseUnits, 'ampere', { prefixes: 'all', words: ['amp', 'amps', 'ampere'] }),
  row('K', '1', temperature, baseUnits, 'kelvin', { prefixes: 'all', words: ['kelvin', 'degK', '°K'] }),
  row('mol', '1', amount, baseUnits, 'mole', { prefixes: 'all', words: ['mole', 'moles'] }),
  row('cd', '1', luminosity, baseUnits, 'candela', { prefixes: 'all', words: ['candela'] }),

  // SI derived units with names
  row('rad', '1', dimensionless, namedUnits, 'radian', { prefixes: 'all', words: ['radian', 'radians'] }),
  row('sr', '1', dimensionless, namedUnits, 'steradian', { prefixes: 'all', words: ['steradian'] }),
  row('Hz', '1', perTime, namedUnits, 'hertz, 1/s', { prefixes: 'all', words: ['hertz', 'cps'] }),
  row('N', '1', force, namedUnits, 'newton, kg·m/s²', { prefixes: 'all', words: ['newton', 'newtons'] }),
  row('Pa', '1', pressure, namedUnits, 'pascal, N/m²', { prefixes: 'all', words: ['pascal', 'pascals'] }),
  row('J', '1', energy, namedUnits, 'joule, N·m', { prefixes: 'all', words: ['joule', 'joules'] }),
  row('W', '1', power, namedUnits, 'watt, J/s', { prefixes: 'all', words: ['watt', 'watts'] }),
  row('C', '1', charge, namedUnits, 'coulomb, A·s (a temperature is °C)', { prefixes: 'all', words: ['coulomb'] }),
  row('V', '1', voltage, namedUnits, 'volt, W/A', { prefixes: 'all', words: ['volt', 'volts'] }),
  row('F', '1', divideDimensions(charge, voltage), namedUnits, 'farad, C/V (a temperature is °F)', {
    prefixes: 'all',
    words: ['farad'],
  }),
  row('Ω', '1', resistance, namedUnits, 'ohm, V/A', { prefixes: 'all', aliases: ['ohm', '\u2126'], words: ['ohms'] }),
  row('S', '1', powerDimension(resistance, -1), namedUnits, 'siemens, A/V', { prefixes: 'all', words: ['siemens'] }),
  row('Wb', '1', magneticFlux, namedUnits, 'weber, V·s', { prefixes: 'all', words: ['weber'] }),
  row('T', '1', divideDimensions(magneticFlux, area), namedUnits, 'tesla, Wb/m²', {
    prefixes: 'all',
    words: ['tesla'],
  }),
  row('H', '1', divideDimensions(magneticFlux, current), namedUnits, 'henry, Wb/A', {
    prefixes: 'all',
    words: ['henry'],
  }),
  row('lm', '1', luminosity, namedUnits, 'lumen, cd·sr', { prefixes: 'all', words: ['lumen'] }),
  row('lx', '1', divideDimensions(luminosity, area), namedUnits, 'lux, lm/m²', { prefixes: 'all', words: ['lux'] }),
  row('Bq', '1', perTime, namedUnits, 'becquerel, 1/s', { prefixes: 'all', words: ['becquerel'] }),
  row('Gy', '1', dose, namedUnits, 'gray, J/kg', { prefixes: 'all', words: ['gray'] }),
  row('Sv', '1', dose, namedUnits, 'sievert, J/kg', { prefixes: 'all', words: ['sievert'] }),
  row('kat', '1', amountFlow, namedUnits, 'katal, mol/s', {
    prefixes: 'all',
    words: ['katal'],
  }),

  // Pressure
  row('bar', '1e5', pressure, sp811, 'bar, 100 kPa', {
    prefixes: [...small, 'k'],
    words: ['bars', 'bara'],
  }),
  row('atm', '101325', pressure, '10th CGPM (1954), resolution 4', 'standard atmosphere, 101 325 Pa', {
    words: ['atmosphere', 'atmospheres'],
  }),
  row('Torr', '101325 / 760', pressure, sp811, 'torr, 1/760 of the standard atmosphere', {
    prefixes: ['m', 'µ'],
    words: ['torr'],
  }),
  row('mmHg', '13.5951 * 9.80665', pressure, sp811, 'conventional millimetre of mercury, 133.322 Pa'),
  row('inHg', '25.4 * 13.5951 * 9.80665', pressure, sp811, 'conventional inch of mercury, 25.4 mmHg'),
  row('psi', poundPerSquareInch, pressure, poundForce, 'pound-force per square inch'),
  row('psia', poundPerSquareInch, pressure, poundForce, 'pound-force per square inch, absolute'),
  row('psig', poundPerSquareInch, pressure, poundForce, 'pound-force per square inch above ambient', { kind: 'gauge' }),
  row('barg', '1e5', pressure, sp811, 'bar above the ambient pressure', { kind: 'gauge' }),
  row('at', '98066.5', pressure, sp811, 'technical atmosphere, one kilogram-force per square centimetre'),

  // Volume, length, force, time
  row('L', '1e-3', volume, acceptedUnits, 'litre, dm³', {
    aliases: ['l'],
    prefixes: ['f', 'p', 'n', 'µ', 'm', 'c', 'd', 'h', 'k'],
    words: ['liter', 'litre', 'liters', 'litres', 'ltr'],
  }),
  row('cc', '1e-6', volume, practice, 'cubic centimetre', { words: ['ccm'] }),
  row('Å', '1e-10', length, sp811, 'ångström, 0.1 nm', {
    aliases: ['\u212B', 'A\u030A', 'angstrom'],
    words: ['Angstrom', 'Ang'],
  }),
  row('in', '0.0254', length, iyp, 'inch, 25.4 mm', { prefixes: ['µ'], words: ['inch', 'inches'] }),
  row('mil', '2.54e-5', length, iyp, 'thousandth of an inch', { words: ['thou', 'mils'] }),
  row('ft', '0.3048', length, iyp, 'foot, 12 in', { words: ['foot', 'feet'] }),
  row('dyn', '1e-5', force, sp811, 'dyne, g·cm/s²', { words: ['dyne', 'dynes'] }),
  row('min', '60', time, acceptedUnits, 'minute', { words: ['minute', 'minutes', 'mins'] }),
  row('h', '3600', time, acceptedUnits, 'hour', { words: ['hr', 'hrs', 'hour', 'hours'] }),
  row('d', '86400', time, acceptedUnits, 'day', { words: ['day', 'days'] }),

  // Temperature
  row('°C', '1', temperature, `${brochure}, 2.3.1`, 'degree Celsius, counted from 273.15 K', {
    kind: 'offset',
    zero: '273.15',
    aliases: ['degC'],
    words: ['celsius', 'Celsius', 'ºC', '℃'],
  }),
  row('°F', '5 / 9', temperature, sp811, 'degree Fahrenheit, counted from 459.67 °R', {
    kind: 'offset',
    zero: '459.67 * 5 / 9',
    aliases: ['degF'],
    words: ['fahrenheit', 'Fahrenheit', 'ºF', '℉'],
  }),
  row('°R', '5 / 9', temperature, sp811, 'degree Rankine, absolute, 5/9 K', {
    aliases: ['degR'],
    words: ['rankine', 'Rankine'],
  }),

  // Amount of gas per time. What "standard" means is stated by the file.
  row('sccm', '1e-6 / 60', amountFlow, practice, 'standard cubic centimetre per minute', { kind: 'standard-flow' }),
  row('slm', '1e-3 / 60', amountFlow, practice, 'standard litre per minute', {
    kind: 'standard-flow',
    words: ['slpm', 'SLPM'],
  }),
  row('sccs', '1e-6', amountFlow, practice, 'standard cubic centimetre per second', { kind: 'standard-flow' }),

  // Energy
  row('eV', '1.602176634e-19', energy, codata, 'electronvolt', { prefixes: [...small, ...thousandUp, 'T'] }),
  row('cal', '4.184', energy, sp811, 'thermochemical calorie, 4.184 J', { prefixes: ['k'], words: ['Cal'] }),
  row('BTU', '1055.05585262', energy, sp811, 'British thermal unit, International Table'),
  row('erg', '1e-7', energy, sp811, 'erg, dyn·cm', { words: ['ergs'] }),

  // Molecules and amounts
  row('u', '1.66053906660e-27', mass, codata, 'unified atomic mass unit', { words: ['amu', 'Da', 'dalton'] }),
  row('lb', '0.45359237', mass, iyp, 'pound (mass)', { words: ['lbs', 'lbm', 'pound', 'pounds'] }),
  row('lbmol', '453.59237', amount, `${iyp}; as the mole to the gram`, 'pound-mole, 453.592 37 mol'),
  row('P', '0.1', multiplyDimensions(pressure, time), sp811, 'poise, 0.1 Pa·s', {
    prefixes: ['c', 'm', 'µ'],
    words: ['poise', 'Poise'],
  }),
  row('D', '1e-21 / 299792458', multiplyDimensions(charge, length), debye, 'debye, 3.335 64e-30 C·m', {
    words: ['debye', 'Debye'],
  }),

  // Plain numbers
  row('°', '3.14159265358979323846264338327950288 / 180', dimensionless, acceptedUnits, 'degree of angle', {
    aliases: ['deg'],
    words: ['degree', 'degrees'],
  }),
  row('%', '1e-2', dimensionless, parts, 'per cent', { words: ['percent', 'pct'] }),
  row('ppm', '1e-6', dimensionless, parts, 'parts per million', { words: ['ppmv', 'vpm'] }),
  row('ppb', '1e-9', dimensionless, parts, 'parts per billion (10⁹)', { words: ['ppbv'] }),
];

function row(
  symbol: string,
  factor: string,
  of: Dimension,
  source: string,
  meaning: string,
  options: Partial<Pick<UnitRow, 'aliases' | 'words' | 'prefixes' | 'kind' | 'zero'>> = {},
): UnitRow {
  return {
    aliases: [],
    words: [],
    prefixes: 'none',
    kind: 'plain',
    ...options,
    symbol,
    factor,
    dimension: of,
    source,
    meaning,
  };
}
