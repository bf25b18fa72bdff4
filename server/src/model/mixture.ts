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
import { unknownName } from './problems/unknownName';
import { wrongType } from './problems/wrongType';
import { plainNumber, quantity } from './quantity';
import { resultNamed } from './results';
import type { Scope } from './scope';
import type { Gas, Members, Quantity, Value } from './values';
import { kindNamed } from '../quantities/quantityKinds';

/** The gas that a mixture describes: a single gas, or parts with their shares. */
export function evaluateMixture(node: Mixture, scope: Scope): Gas | undefined {
  const [only, second] = node.parts;
  if (only && !second && !only.amount) return singleGas(only.name, scope);
  const parts = readParts(node, scope, (name) => gasNamed(name, scope));
  const gas = parts && blend(parts);
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
function blend(parts: readonly Part[]): Gas {
  const shares = new Map<string, Share>();
  for (const { gas: part, fraction } of parts) {
    part.composition.species.forEach((species, index) => {
      const own = multiply(fraction, part.fractions[index] ?? plainNumber(0));
      const before = shares.get(species.formula);
      shares.set(species.formula, { species, fraction: before ? add(before.fraction, own) : own });
    });
  }
  return gas([...shares.values()]);
}

interface Share {
  readonly species: Species;
  readonly fraction: Quantity;
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
  shares.forEach(({ species: each }, index) => {
    const fraction = fractions[index] ?? plainNumber(0);
    const mass = masses[index] ?? 0;
    species.set(
      each.formula,
      members({
        mole_fraction: fraction,
        mass_fraction: massFraction(each, fraction, molarMass, mass),
        molar_mass: ownMass(each),
      }),
    );
  });
  return { kind: 'gas', composition, fractions, members: members({ molar_mass: molarMass }), species };
}

/** M = Σ xᵢMᵢ. The fractions add up to one, so only differences of molar mass make it uncertain. */
function totalMolarMass(shares: readonly Share[], si: number): Quantity {
  const [first] = shares;
  if (!first) return molar(si);
  const reference = molar(first.species.molarMass.value);
  const sum = shares.reduce(
    (total, { species, fraction }) =>
      add(total, multiply(fraction, subtract(molar(species.molarMass.value), reference))),
    reference,
  );
  return { ...sum, si };
}

function massFraction(species: Species, fraction: Quantity, molarMass: Quantity, si: number): Quantity {
  return { ...divide(multiply(fraction, molar(species.molarMass.value)), molarMass), si };
}

function ownMass(species: Species): Quantity {
  return molar(species.molarMass.value);
}

function molar(si: number): Quantity {
  const kind = kindNamed('molar_mass');
  return { ...quantity(si, kind?.dimension ?? dimensionless), quantityKind: 'molar_mass' };
}

function members(values: Readonly<{ [name: string]: Quantity }>): Members {
  const provenance = { method: 'composition: molar masses by CIAAW', sources: [], assumptions: [] };
  return new Map(
    Object.entries(values).map(([name, value]) => {
      const kind = resultNamed(name)?.quantityKind;
      const { unit: _unit, ...plain } = value;
      return [name, figure(kind ? { ...plain, quantityKind: kind } : plain, provenance)];
    }),
  );
}
