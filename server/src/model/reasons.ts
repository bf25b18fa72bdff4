import { sources } from '../physics/sources';
import type { SourceId } from '../physics/sources';
import type { DataKind, Reason } from '../physics/outcome';
import { formatNumber } from '../quantities/format';

/** Why the engine has no value, in a reader's words. */
export function explainReason(reason: Reason): string {
  switch (reason.kind) {
    case 'no-data':
      return `no ${dataTitle(reason.property)} is known for ${reason.species}`;
    case 'outside-range':
      return `${spoken(reason.quantity)} is ${withUnit(reason.value, reason.quantity)}, outside ${formatNumber(reason.low, 4)} to ${withUnit(reason.high, reason.quantity)} where anything is known`;
    case 'not-positive':
      return `${spoken(reason.quantity)} is ${formatNumber(reason.value, 4)}; it must be above zero`;
    case 'not-finite':
      return `${spoken(reason.quantity)} is too large or too small to be represented`;
    case 'insufficient':
      return `${reason.given.map(spoken).join(' and ')} do not fix the state; give pressure or temperature as well`;
    case 'surplus':
      return `${reason.given.map(spoken).join(', ')} are more than fix the state`;
    case 'per-species':
      return `a mixture has no ${spoken(reason.property)} of its own; ask for that of a species, as in NAME.N2.${reason.property}`;
    case 'above-critical': {
      const { quantity, critical, species } = reason;
      const limit =
        quantity === 'temperature' ? `${formatNumber(critical, 4)} K` : `${formatNumber(critical / 1e5, 4)} bar`;
      return `above its critical ${quantity} of ${limit}, ${species} does not condense`;
    }
    case 'diffuse-only':
      return `free-molecular flow through ${withArticle(reason.passage)} is known for wholly diffuse walls only; leave its accommodation out`;
    case 'empty-composition':
      return 'the gas has no parts';
    case 'fraction-sum':
      return `the fractions add up to ${formatNumber(100 * reason.sum, 6)} %`;
  }
}

function withArticle(noun: string): string {
  return /^[aeiou]/.test(noun) ? `an ${noun}` : `a ${noun}`;
}

export function dataTitle(data: DataKind): string {
  switch (data) {
    case 'viscosity':
      return 'viscosity';
    case 'conductivity':
      return 'thermal conductivity';
    case 'heat_capacity':
      return 'heat capacity';
    case 'pair_potential':
      return 'intermolecular potential';
    case 'saturation_pressure':
      return 'saturation pressure';
    case 'saturation_curve':
      return 'course of the saturation pressure with temperature';
    case 'critical_point':
      return 'critical point';
  }
}

/** A published work, as a reference reads. */
export function citation(id: SourceId): string {
  if (id === 'the file') return 'as stated in the file';
  const source: { authors: string; title: string; year: number; published: string; doi?: string } = sources[id];
  const { authors, title, year, published, doi } = source;
  return `${authors} (${year}): ${title.replace(/\.$/, '')}. ${published}${doi ? `, doi:${doi}` : ''}`;
}

/** `numberDensity`, `mean_free_path` → `number density`, `mean free path` */
export function spoken(name: string): string {
  return name.replace(/_/g, ' ').replace(/[A-Z]/g, (letter) => ` ${letter.toLowerCase()}`);
}

/** The numbers of a reason are SI. */
function withUnit(value: number, quantity: string): string {
  return `${formatNumber(value, 4)}${units.get(quantity) ?? ''}`;
}

const units: ReadonlyMap<string, string> = new Map([
  ['temperature', ' K'],
  ['pressure', ' Pa'],
]);
