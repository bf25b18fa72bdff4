import { constantNamed, constants } from '../quantities/constants';
import { nearestNames } from '../quantities/nearestNames';
import { unitOf } from '../quantities/parseUnit';
import type { Member, Name } from '../syntax/nodes';
import { describeValue, evaluate } from './expression';
import { laterResults } from './kinds/list';
import { nominalBore, nominalBoreNames } from './nominalBores';
import { noData } from './problems/noData';
import { notComputedYet } from './problems/notComputedYet';
import { unknownName } from './problems/unknownName';
import { unknownProperty } from './problems/unknownProperty';
import { quantity } from './quantity';
import type { Scope } from './scope';
import { leanOn } from './tolerance';
import type { Members, Quantity, Record, Value } from './values';

/** The value of a name. */
export function evaluateName(node: Name, scope: Scope, what = 'value'): Value | undefined {
  const found = scope.lookUp(node.text);
  if (found.kind === 'found') return found.value;
  if (found.kind === 'blocked') return undefined;
  const bore = nominalBore(node.text);
  if (bore) return bore;
  const nearest = nearestNames(node.text, /^DN\d/.test(node.text) ? nominalBoreNames : scope.names());
  scope.report(unknownName.at(node.span, { what, name: node.text, nearest }));
  return undefined;
}

/** `foreline.bore`, `residual.Ar.partial_pressure`, `const.k` */
export function evaluateMember(node: Member, scope: Scope): Value | undefined {
  if (node.object.kind === 'name' && node.object.text === 'const' && scope.lookUp('const').kind === 'unknown') {
    return node.property.kind === 'name' ? constant(node.property, scope) : undefined;
  }
  const object = evaluate(node.object, scope);
  if (!object || node.property.kind === 'hole') return undefined;
  return memberOf(object, node.property, scope);
}

function memberOf(object: Value, property: Name, scope: Scope): Value | undefined {
  if (object.kind === 'pending') return undefined;
  if (object.kind !== 'record' && object.kind !== 'gas') {
    const what = describeValue(object);
    scope.report(unknownProperty.at(property.span, { what, property: property.text, nearest: [] }));
    return undefined;
  }
  const species = object.species.get(property.text);
  if (species) return speciesView(property.text, species);
  const figure = object.members.get(property.text);
  if (figure?.kind === 'figure') return figure.value;
  if (figure) scope.report(noData.at(property.span, { why: figure.why }));
  else reportUnknown(object.kind === 'record' ? object.word : 'gas', object.members, property, scope);
  return undefined;
}

/** One species of a mixture, as a thing with results of its own. */
function speciesView(formula: string, members: Members): Record {
  return { kind: 'record', word: formula, members, species: new Map(), inputs: new Map() };
}

function reportUnknown(word: string, members: Members, property: Name, scope: Scope): void {
  if (laterResults(word).includes(property.text)) {
    scope.report(notComputedYet.at(property.span, { what: property.text }));
    return;
  }
  const what = `a ${word}`.replace(/^a (?=[aeiou])/, 'an ');
  const nearest = nearestNames(property.text, members.keys());
  scope.report(unknownProperty.at(property.span, { what, property: property.text, nearest }));
}

function constant(property: Name, scope: Scope): Quantity | undefined {
  const found = constantNamed(property.text);
  if (!found) {
    const nearest = nearestNames(
      property.text,
      constants.map(({ name }) => name),
    );
    scope.report(unknownProperty.at(property.span, { what: 'const', property: property.text, nearest }));
    return undefined;
  }
  const unit = unitOf(found.unit);
  const value = quantity(found.value * unit.factor, unit.dimension);
  // Constants are published with one standard uncertainty; coverage of 95 % takes two.
  return found.uncertainty === undefined
    ? { ...value, unit }
    : { ...value, unit, leans: leanOn(`const.${found.name}`, 2 * found.uncertainty * unit.factor) };
}
