import type { Composition } from '../physics/composition';
import { massFractions, meanMolarMass } from '../physics/composition';
import { speciesByName, speciesList } from '../physics/species/list';
import type { Species } from '../physics/species/species';
import { dimensionless } from '../quantities/dimension';
import { nearestNames } from '../quantities/nearestNames';
import type { Mixture, MixturePart, Name } from '../syntax/nodes';
import { add, divide, multiply, subtract } from './arithmetic';
import { describeValue } from './expression';
import { figure } from './figures';
import { reportGasRemarks } from './gasRemarks';
import type { Part } from './mixtureParts';
import { readParts } from './mixtureParts';
import { contradictoryInput } from './problems/contradictoryInput';
import { unknownName } from './problems/unknownName';
import { wrongType } from './problems/wrongType';
import { plainNumber, quantity } from './quantity';
import { resultNamed } from './results';
import type { Scope } from './scope';
import { speciesOf } from './statedGas';
import type { Leans } from './tolerance';
import type { Gas, Members, Quantity, StatedSpecies, Value } from './values';
import { kindNamed } from '../quantities/quantityKinds';

/** The gas that a mixture describes: a single gas, or parts with their shares. */
export function evaluateMixture(node: Mixture, scope: Scope): Gas | undefined {
  const [only, second] = node.parts;
  if (only && !second && !only.amount) return singleGas(only.name, scope);
  const parts = readParts(node, scope, (name) => gasNamed(name, scope));
  const gas = parts && blend(parts, node, scope);
  if (gas) reportGasRemarks(gas, node.span, scope);
  return gas;
}

/** A gas by its name alone. One that a file declares has had its remarks there. */
function singleGas(node: MixturePart['name'], scope: Scope): Gas | undefined {
  const gas = gasNamed(node, scope);
  if (gas && node.kind === 'name' && gas === builtInGas(node.text)) reportGasRemarks(gas, node.span, scope);
  return gas;
}

/** A gas declared in a file, or a built-in species. */
export function gasNamed(node: MixturePart['name'], scope: Scope): Gas | undefined {
  if (node.kind === 'hole') return undefined;
  const found = scope.lookUp(node.text);
  if (found.kind === 'blocked') return undefined;
  if (found.kind === 'found') {
    const gas = gasOf(found.value);
    if (!gas)
      scope.report(
        wrongType.at(node.span, { subject: 'this place', wants: 'a gas', found: describeValue(found.value) }),
      );
    return gas;
  }
  reportUnknown(node, scope);
  return undefined;
}

export function gasOf(value: Value): Gas | undefined {
  return value.kind === 'gas' ? value : undefined;
}

/** A molecule that a file declares, as a gas of its own. */
export function statedGas(stated: StatedSpecies): Gas {
  return gas([{ species: speciesOf(stated), fraction: plainNumber(1), stated }]);
}

/** A built-in gas, by its formula or one of its names. */
export function builtInGas(name: string): Gas | undefined {
  const species = speciesByName(name) ?? speciesByName(name.replaceAll('_', ' '));
  if (!species) return undefined;
  const known = pureGases.get(species.formula) ?? gas([{ species, fraction: plainNumber(1) }]);
  pureGases.set(species.formula, known);
  return known;
}

const pureGases = new Map<string, Gas>();

/** Every name of a built-in gas, as files write it: a common name of two words takes an underscore. */
export const gasNames: readonly string[] = speciesList.flatMap(({ formula, names }) =>
  [formula, ...names].map((name) => name.replaceAll(' ', '_')),
);

function reportUnknown(node: Name, scope: Scope): void {
  const nearest = nearestNames(node.text, [...gasNames, ...scope.names()]);
  scope.report(unknownName.at(node.span, { what: 'gas', name: node.text, nearest }));
}

/** A mixture of mixtures is one mixture; a species that comes in twice is counted together. */
function blend(parts: readonly Part[], node: Mixture, scope: Scope): Gas | undefined {
  const shares = new Map<string, Share>();
  for (const { gas: part, fraction } of parts) {
    for (const [index, species] of part.composition.species.entries()) {
      const { formula } = species;
      const own = multiply(fraction, part.fractions[index] ?? plainNumber(0));
      const before = shares.get(formula);
      if (before && !alike(before.species, species)) {
        scope.report(contradictoryInput.at(node.span, { why: `two different species are both called ${formula}` }));
        return undefined;
      }
      const stated = part.stated.get(formula);
      const share = { species, fraction: before ? add(before.fraction, own) : own };
      shares.set(formula, stated ? { ...share, stated } : share);
    }
  }
  return gas([...shares.values()]);
}

/** Used files may each declare a species of the same name. */
function alike(one: Species, other: Species): boolean {
  return one === other || JSON.stringify(one) === JSON.stringify(other);
}

interface Share {
  readonly species: Species;
  readonly fraction: Quantity;
  /** If a file declares it. */
  readonly stated?: StatedSpecies;
}

function gas(shares: readonly Share[]): Gas {
  const composition: Composition = {
    species: shares.map(({ species }) => species),
    moleFractions: shares.map(({ fraction }) => fraction.si),
  };
  const fractions = shares.map(({ fraction }) => ({
    ...quantity(fraction.si, dimensionless, fraction.leans),
    quantityKind: 'fraction',
  }));
  const molarMass = totalMolarMass(shares, meanMolarMass(composition));
  const masses = massFractions(composition);
  const species = new Map<string, Members>();
  shares.forEach((share, index) => {
    const fraction = fractions[index] ?? plainNumber(0);
    const mass = masses[index] ?? 0;
    const own = ownMass(share);
    species.set(
      share.species.formula,
      members(
        {
          mole_fraction: fraction,
          mass_fraction: massFraction(own, fraction, molarMass, mass),
          molar_mass: own,
        },
        [share],
      ),
    );
  });
  const stated = new Map(
    shares.flatMap((share) => (share.stated ? [[share.species.formula, share.stated] as const] : [])),
  );
  return { kind: 'gas', composition, fractions, stated, members: members({ molar_mass: molarMass }, shares), species };
}

/** M = Σ xᵢMᵢ. The fractions add up to one, so only differences of molar mass make it uncertain. */
function totalMolarMass(shares: readonly Share[], si: number): Quantity {
  const [first] = shares;
  if (!first) return molar(si);
  const reference = ownMass(first);
  const sum = shares.reduce(
    (total, share) => add(total, multiply(share.fraction, subtract(ownMass(share), reference))),
    reference,
  );
  return { ...sum, si };
}

function massFraction(own: Quantity, fraction: Quantity, molarMass: Quantity, si: number): Quantity {
  return { ...divide(multiply(fraction, own), molarMass), si };
}

/** Exact if it is of a built-in species: its error is far below that of anything else. */
function ownMass({ species, stated }: Share): Quantity {
  const mass = stated?.inputs.get('molar_mass');
  return molar(species.molarMass.value, mass?.kind === 'quantity' ? mass.leans : undefined);
}

function molar(si: number, leans?: Leans): Quantity {
  const kind = kindNamed('molar_mass');
  return { ...quantity(si, kind?.dimension ?? dimensionless, leans), quantityKind: 'molar_mass' };
}

function members(values: Readonly<{ [name: string]: Quantity }>, shares: readonly Share[]): Members {
  const [built, stated] = [shares.some((share) => !share.stated), shares.some((share) => share.stated)];
  const origin = [...(built ? ['by CIAAW'] : []), ...(stated ? ['as the file states them'] : [])].join(' or ');
  const provenance = { method: `composition: molar masses ${origin}`, sources: [], assumptions: [] };
  return new Map(
    Object.entries(values).map(([name, value]) => {
      const kind = resultNamed(name)?.quantityKind;
      const { unit: _unit, ...plain } = value;
      return [name, figure(kind ? { ...plain, quantityKind: kind } : plain, provenance)];
    }),
  );
}
