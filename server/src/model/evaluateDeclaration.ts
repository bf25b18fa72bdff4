import { nearestNames } from '../quantities/nearestNames';
import { describeDimension, describeUnit, kindNamed, quantityKinds } from '../quantities/quantityKinds';
import type { Declaration, DisplayDeclaration, Item, Name, SiteDeclaration, ThingDeclaration } from '../syntax/nodes';
import { evaluateAssumption } from './assumption';
import type { Evaluated, Outcome } from './evaluated';
import { blocked, failed, none } from './evaluated';
import { describeValue, evaluate } from './expression';
import { placeOf, readInputs } from './inputs';
import type { HeadDefinition, Kind } from './kinds/kind';
import { kindOfWord, kinds } from './kinds/list';
import { checkRoute, evaluateLine } from './kinds/line';
import { computeSite } from './kinds/site';
import { statements } from './kinds/statements';
import { readUnit } from './literal';
import { evaluateName } from './member';
import { evaluateMixture } from './mixture';
import { fileNotFound } from './problems/fileNotFound';
import { missingInput } from './problems/missingInput';
import { mixedParts } from './problems/mixedParts';
import { notComputedYet } from './problems/notComputedYet';
import type { Problem } from './problems/problem';
import { either } from './problems/problem';
import { unitMismatch } from './problems/unitMismatch';
import { unknownKind } from './problems/unknownKind';
import { unknownName } from './problems/unknownName';
import { wrongType } from './problems/wrongType';
import { evaluateRequirement } from './requirement';
import type { DeclarationScope } from './scope';
import { syntaxProblems } from './syntaxProblems';
import type { Gas, Record, Value } from './values';

/** Evaluates one declaration. The result depends on its text and on what it reads through the scope, on nothing else. */
export function evaluateDeclaration(
  item: Item,
  open: (report: (problem: Problem) => void) => DeclarationScope,
): Evaluated {
  const broken = opensNothing(item.declaration) ? [] : syntaxProblems(item.declaration);
  const problems: Problem[] = [...broken];
  const scope = open((problem) => {
    // What is missing may be what cannot be read.
    if (broken.length === 0 || !MISSING.includes(problem.code)) problems.push(problem);
  });
  const value = valueOf(item, scope);
  return { outcome: outcomeOf(value, problems), problems };
}

const MISSING = [missingInput.code, mixedParts.code];

/** A line that opens no declaration: the problem is its first word, not all that follows. */
function opensNothing({ kind, word }: Declaration): boolean {
  return kind === 'stray' && word.text !== '' && !openingWords.includes(word.text);
}

const openingWords: readonly string[] = [...statements, ...kinds].map(({ word }) => word);

function outcomeOf(value: Value | 'none' | undefined, problems: readonly Problem[]): Outcome {
  const wrong = problems.some(({ severity, code }) => severity === 'error' && !code.startsWith('requirement-'));
  if (wrong) return failed;
  if (value === 'none') return none;
  return value === undefined ? blocked : { kind: 'value', value };
}

function valueOf(item: Item, scope: DeclarationScope): Value | 'none' | undefined {
  const { declaration } = item;
  switch (declaration.kind) {
    case 'let':
      return evaluate(declaration.value, scope);
    case 'use':
      if (declaration.path.kind === 'text' && scope.used(declaration.path.text) === 'missing') {
        scope.report(fileNotFound.at(declaration.path.span, { path: declaration.path.text }));
      }
      return 'none';
    case 'display':
      checkDisplay(declaration, scope);
      return 'none';
    case 'assume':
      return evaluateAssumption(declaration, scope);
    case 'gas':
      return declaration.mixture.kind === 'mixture' ? evaluateMixture(declaration.mixture, scope) : undefined;
    case 'require':
      return evaluateRequirement(declaration, item.text, scope);
    case 'line':
      return evaluateLine(declaration, scope);
    case 'site':
      return evaluateSite(declaration, scope);
    case 'thing':
      return evaluateThing(declaration, scope);
    case 'stray':
      reportKind(declaration.word, scope);
      return undefined;
  }
}

function checkDisplay({ items }: DisplayDeclaration, scope: DeclarationScope): void {
  for (const { quantity, unit } of items) {
    const kind = quantity.kind === 'name' ? kindNamed(quantity.text) : undefined;
    if (quantity.kind === 'name' && !kind) {
      const nearest = nearestNames(
        quantity.text,
        quantityKinds.map(({ name }) => name),
      );
      scope.report(unknownName.at(quantity.span, { what: 'kind of quantity', name: quantity.text, nearest }));
    }
    const read = unit.kind === 'unit' ? readUnit(unit, scope) : undefined;
    if (!kind || !read || read.dimension === kind.dimension) continue;
    const subject = kind.name;
    const meant = { span: unit.span, candidates: kind.usual };
    scope.report(
      unitMismatch.at(unit.span, {
        subject,
        wants: describeDimension(kind.dimension),
        found: read.text,
        measures: describeUnit(read),
        unit: meant,
      }),
    );
  }
}

function evaluateThing(node: ThingDeclaration, scope: DeclarationScope): Value | undefined {
  const kind = kindOfWord(node.word.text);
  if (!kind) {
    reportKind(node.word, scope);
    return undefined;
  }
  const head = readHead(node, kind, scope);
  reportForeignItems(node, kind, scope);
  const inputs = readInputs(node, kind, scope, head ? head.from?.inputs : inheritedUnknown(node));
  if (!kind.compute) {
    scope.report(notComputedYet.at(node.word.span, { what: kind.title }));
    return { kind: 'pending', word: kind.word };
  }
  if (!head || !inputs) return undefined;
  const record = kind.compute({ node, inputs, ...head, place: (key) => placeOf(node, key) }, scope);
  return record ?? undefined;
}

/** A declaration `from` something that cannot be read. */
function inheritedUnknown({ head }: ThingDeclaration): 'unknown' | undefined {
  return head?.relation.text === 'from' ? 'unknown' : undefined;
}

interface ReadHead {
  readonly gas?: Gas;
  readonly from?: Record;
}

function readHead(node: ThingDeclaration, kind: Kind, scope: DeclarationScope): ReadHead | undefined {
  const { head } = node;
  if (!head) {
    if (kind.heads.length === 0) return {};
    const of = kind.heads.map(
      ({ relation, wants }) =>
        `“${relation}” and ${wants === 'gas' ? 'a gas' : wants === 'route' ? 'a passage' : 'a name'}`,
    );
    scope.report(
      missingInput.at(node.name.span, { what: kind.title, count: 1, of: [either(of)], given: [], fixes: [] }),
    );
    return undefined;
  }
  const definition = kind.heads.find(({ relation }) => relation === head.relation.text);
  if (!definition) {
    const wants =
      kind.heads.length === 0
        ? 'nothing between its name and its block'
        : either(kind.heads.map(({ relation }) => `“${relation}”`));
    scope.report(wrongType.at(head.relation.span, { subject: kind.title, wants, found: `“${head.relation.text}”` }));
    return undefined;
  }
  if (definition.wants === 'route') return checkRoute(head.target, scope) ? {} : undefined;
  if (definition.wants === 'gas') {
    const gas = head.target.kind === 'mixture' ? evaluateMixture(head.target, scope) : undefined;
    return gas && { gas };
  }
  const { target } = head;
  if (target.kind === 'series' || target.kind === 'parallel') {
    const wants = `a ${either(definition.words ?? [])}`;
    scope.report(wrongType.at(target.span, { subject: `“${definition.relation}”`, wants, found: 'several passages' }));
    return undefined;
  }
  const from = recordNamed(target.kind === 'mixture' ? target.parts[0]?.name : target, definition, scope);
  return from && { from };
}

function recordNamed(
  name: { kind: string } | undefined,
  definition: HeadDefinition,
  scope: DeclarationScope,
): Record | undefined {
  if (name?.kind !== 'name') return undefined;
  const node = name as Name;
  const value = evaluateName(node, scope, definition.words?.join(' or '));
  if (value === undefined || value.kind === 'pending') return undefined;
  if (value.kind === 'record' && (definition.words ?? []).includes(value.word)) return value;
  scope.report(
    wrongType.at(node.span, {
      subject: `“${definition.relation}”`,
      wants: `a ${either(definition.words ?? [])}`,
      found: describeValue(value),
    }),
  );
  return undefined;
}

/** Entries of other kinds of block: an arrow in a tube, an input in a system. */
function reportForeignItems(node: ThingDeclaration, kind: Kind, scope: DeclarationScope): void {
  for (const item of node.block?.items ?? []) {
    if (item.kind === 'connection' && kind.word !== 'system') {
      scope.report(
        wrongType.at(item.span, { subject: kind.title, wants: 'inputs such as key = value', found: 'a connection' }),
      );
    } else if ((item.kind === 'vary' || item.kind === 'show') && kind.word !== 'sweep') {
      scope.report(
        wrongType.at(item.span, { subject: kind.title, wants: 'inputs such as key = value', found: `“${item.kind}”` }),
      );
    }
  }
}

function evaluateSite(node: SiteDeclaration, scope: DeclarationScope): Value | undefined {
  const state = evaluate(node.state, scope);
  const geometry = evaluate(node.geometry, scope);
  if (!state || !geometry || state.kind === 'pending') return undefined;
  if (state.kind !== 'record' || state.word !== 'state') {
    scope.report(
      wrongType.at(node.state.span, { subject: 'a site', wants: 'the name of a state', found: describeValue(state) }),
    );
    return undefined;
  }
  const around = node.relation.kind === 'name' && node.relation.text === 'around';
  const word = geometry.kind === 'record' || geometry.kind === 'pending' ? geometry.word : '';
  const fits = around
    ? word === 'particle'
    : word !== 'particle' && (word === 'line' || kindOfWord(word)?.role === 'geometry');
  if (!fits) {
    const wants = around ? 'the name of a particle after “around”' : 'the name of a geometry after “in”';
    scope.report(wrongType.at(node.geometry.span, { subject: 'a site', wants, found: describeValue(geometry) }));
    return undefined;
  }
  // The geometry itself says that it is not computed yet.
  return geometry.kind === 'record' ? computeSite(state, geometry, node.geometry.span, scope) : undefined;
}

function reportKind(word: Name, scope: DeclarationScope): void {
  if (word.text === '') return;
  if (openingWords.includes(word.text)) {
    scope.report(
      missingInput.at(word.span, { what: `“${word.text}”`, count: 1, of: ['a name'], given: [], fixes: [] }),
    );
    return;
  }
  scope.report(unknownKind.at(word.span, { word: word.text, nearest: nearestNames(word.text, openingWords) }));
}
