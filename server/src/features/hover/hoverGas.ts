import { citation } from '../../model/reasons';
import { quantity, show } from '../../model/quantity';
import type { ShowOptions } from '../../model/quantity';
import type { Gas, Members } from '../../model/values';
import { unitOf } from '../../quantities/parseUnit';
import { describeMembers, showFigure } from '../describe/describe';
import { describePercent } from '../describe/describePercent';
import { bold, code, list, paragraphs, plainText, table } from './hoverMarkdown';

type Species = Gas['composition']['species'][number];

/** A species: what is known of it, from where, and how it may hurt. `members` are its share in the mixture at hand. */
export function hoverSpecies(species: Species, share: string | undefined, options: ShowOptions): string {
  const names = species.names.filter((name) => name !== species.formula);
  const mass = show(quantity(species.molarMass.value, unitOf('kg/mol').dimension), {
    ...options,
    unit: unitOf('g/mol'),
    digits: 6,
  });
  return paragraphs([
    `${bold(species.formula)}${names.length > 0 ? `, ${plainText(names.join(', '))}` : ''}`,
    share,
    `Molar mass ${plainText(mass)}, ${plainText(whereOf(species.molarMass))}`,
    list(dataOf(species).map(plainText)),
    hazardNote([species]),
  ]);
}

/** `In purge: 95.00 % of the molecules, 96.05 % of the mass`. */
export function shareNote(where: string, members: Members | undefined, options: ShowOptions): string | undefined {
  const moles = members?.get('mole_fraction');
  const mass = members?.get('mass_fraction');
  if (moles?.kind !== 'figure' || mass?.kind !== 'figure') return undefined;
  const shown = `${showFigure(moles.value, options)} of the molecules, ${showFigure(mass.value, options)} of the mass`;
  return `In ${code(where)}: ${plainText(shown)}.`;
}

/** The species of a mixture with their shares. */
export function shareTable(gas: Gas, options: ShowOptions): string | undefined {
  const { species } = describeMembers(gas, options);
  const share = (rows: (typeof species)[number]['rows'], name: string) =>
    plainText(rows.find((row) => row.name === name)?.text ?? '');
  return table(
    ['species', 'share of the molecules', 'share of the mass'],
    species.map(({ formula, rows }) => [code(formula), share(rows, 'mole_fraction'), share(rows, 'mass_fraction')]),
  );
}

/** The general hazard classes of gases; who handles them must look elsewhere. */
export function hazardNote(gases: readonly Species[]): string | undefined {
  const known = gases.filter(({ hazards }) => hazards.length > 0);
  if (known.length === 0) return undefined;
  const classes = known.map(({ formula, hazards }) => {
    const each = hazards.map(({ value, where }) => (where === undefined ? value : `${value} (${where})`));
    return plainText(`${formula}: ${each.join(', ')}`);
  });
  return `**Hazards**\n\n${list(classes)}\n\n${plainText(caution)}`;
}

const caution =
  'General classes only, not a complete assessment. Follow the safety data sheet, local codes and licensed practice.';

function dataOf(species: Species): string[] {
  const { viscosity, conductivity, heatCapacity, lennardJones, dipoleMoment, blend } = species;
  return [
    ...(viscosity ? [`viscosity ${rangeOf(viscosity.value)}${errorOf(viscosity)}: ${whereOf(viscosity)}`] : []),
    ...(conductivity
      ? [`thermal conductivity ${rangeOf(conductivity.value)}${errorOf(conductivity)}: ${whereOf(conductivity)}`]
      : []),
    ...(heatCapacity
      ? [`heat capacity ${rangeOf(heatCapacity.value)}${errorOf(heatCapacity)}: ${whereOf(heatCapacity)}`]
      : []),
    ...(lennardJones ? [`intermolecular potential: ${whereOf(lennardJones)}`] : []),
    ...(dipoleMoment ? [`dipole moment: ${whereOf(dipoleMoment)}`] : []),
    ...(blend ? [`a blend treated as one gas: ${whereOf(blend)}`] : []),
  ];
}

type Data = Pick<Species['molarMass'], 'source' | 'where' | 'uncertainty'>;

function whereOf({ source, where }: Data): string {
  return where === undefined ? citation(source) : `${citation(source)}; ${where}`;
}

function errorOf({ uncertainty }: Data): string {
  if (uncertainty === undefined) return '';
  return uncertainty === 0 ? ', exact' : `, stated error ${describePercent(uncertainty)}`;
}

function rangeOf(data: object): string {
  if (!('low' in data) || !('high' in data)) return 'at any temperature';
  const kelvin = (value: unknown) =>
    show(quantity(Number(value), unitOf('K').dimension), { unit: unitOf('K'), digits: 4 });
  return `from ${kelvin(data.low)} to ${kelvin(data.high)}`;
}
