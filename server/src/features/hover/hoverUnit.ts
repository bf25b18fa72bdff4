import { quantity, show } from '../../model/quantity';
import { coherentUnitText } from '../../quantities/dimension';
import { toSI, unitFactor } from '../../quantities/conversion';
import type { Unit } from '../../quantities/parseUnit';
import { parseUnit, unitOf } from '../../quantities/parseUnit';
import type { UnitText } from '../../syntax/nodes';
import { kindMeant } from '../describe/describeUnits';
import { bold, list, paragraphs, plainText } from './hoverMarkdown';
import type { HoverPlace } from './hoverPlace';
import { sentence } from './hoverWord';

/** A unit: what it is in SI, what its parts are and where they are defined. */
export function hoverUnit({ text }: UnitText, { options }: HoverPlace): string | undefined {
  const result = parseUnit(text);
  if (!result.ok) return undefined;
  const { unit } = result;
  const kind = kindMeant(unit);
  const rows = [...new Set(unit.parts.map((part) => part.row))];
  return paragraphs([
    `${bold(unit.text)}${kind ? `, a unit of ${plainText(kind.title.toLowerCase())}` : ''}`,
    plainText(inSI(unit, options)),
    list(rows.map(({ symbol, meaning, source }) => plainText(`${symbol}: ${meaning} (${source})`))),
    referenceOf(unit, options),
  ]);
}

/** What a standard flow refers to; of other units nothing. */
export function referenceOf(unit: Unit, { reference }: HoverPlace['options']): string | undefined {
  if (unit.standardPower === 0 || !reference) return undefined;
  const temperature = show(quantity(reference.temperature, unitOf('K').dimension), { unit: unitOf('°C'), digits: 5 });
  const pressure = show(quantity(reference.pressure, unitOf('Pa').dimension), { unit: unitOf('kPa'), digits: 6 });
  return sentence(`the standard conditions here are ${temperature} and ${pressure}`);
}

/** One of a unit in the coherent unit of its kind; of a scale with an offset also where it begins. */
export function inSI(unit: Unit, { reference }: Pick<HoverPlace['options'], 'reference'>): string {
  const coherent = unitOf(kindMeant(unit)?.unit ?? coherentUnitText(unit.dimension));
  const inCoherent = (si: number) => show(quantity(si, unit.dimension), { unit: coherent, digits: 6 });
  if (unit.text === coherent.text) return 'The coherent SI unit.';
  switch (unit.kind) {
    case 'offset':
      return `0 ${unit.text} is ${inCoherent(toSI(0, unit))}; a step of 1 ${unit.text} is ${inCoherent(unitFactor(unit))}.`;
    case 'gauge':
      return `1 ${unit.text} is ${inCoherent(unitFactor(unit))} above the ambient pressure.`;
    case 'plain':
    case 'standard-flow':
      return `1 ${unit.text} is ${inCoherent(unitFactor(unit, reference))}.`;
  }
}
