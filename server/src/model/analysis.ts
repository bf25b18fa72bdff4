import type { File, Item, Name } from '../syntax/nodes';
import { MOST_SHOWN, roundFrom } from './circle';
import type { Declared } from './declare';
import type { Document, Shape } from './document';
import type { Evaluated, Outcome } from './evaluated';
import type { Evaluation, Place } from './evaluation';
import { circularDefinition } from './problems/circularDefinition';
import { duplicateName } from './problems/duplicateName';
import type { Problem, Related } from './problems/problem';
import { unusedDeclaration } from './problems/unusedDeclaration';
import type { DisplayUnits } from './quantity';
import { references } from './references';
import type { DeclarationScope } from './scope';

/** Everything there is to say of one file at one moment. Features read it and nothing else. */
export interface Analysis {
  readonly uri: string;
  readonly text: string;
  readonly file: File;
  readonly declared: readonly Declared[];
  readonly display: DisplayUnits;
  /** The addresses of the files it uses, as far as they can be read. */
  readonly uses: Document['uses'];
  outcome(declared: Declared): Outcome;
  problems(): readonly LocatedProblem[];
  /** Where a name is declared: here or in a file that is used. */
  find(name: string): Place | undefined;
  /** To evaluate an expression of a declaration by itself, for showing. */
  scope(declared: Declared, report?: (problem: Problem) => void): DeclarationScope;
  /** The declarations that had to run for this analysis. */
  readonly ran: readonly string[];
}

/** A problem of this file; its spans count from `offset`. */
export interface LocatedProblem {
  readonly problem: Problem;
  readonly offset: number;
  readonly declared: Declared;
}

export function createAnalysis(document: Document, evaluation: Evaluation): Analysis {
  const { declarations, file, uri, text, display, uses } = document;
  const evaluated = (declared: Declared): Evaluated => evaluation.evaluated({ document, declared });
  let problems: readonly LocatedProblem[] | undefined;
  return {
    uri,
    text,
    file,
    declared: declarations.all,
    display,
    uses,
    outcome: (declared) => evaluated(declared).outcome,
    problems: () => (problems ??= allProblems(document, evaluation, evaluated)),
    find: (name) => evaluation.find(document, name),
    scope: (declared, report = () => undefined) => evaluation.scope({ document, declared }, report),
    ran: evaluation.ran,
  };
}

function allProblems(
  document: Document,
  evaluation: Evaluation,
  evaluated: (declared: Declared) => Evaluated,
): readonly LocatedProblem[] {
  const unused = unusedDeclarations(document);
  return document.declarations.all.flatMap((declared) => {
    const own = [
      ...evaluated(declared).problems,
      ...duplicate(document, declared),
      ...circular({ document, declared }, evaluation),
    ];
    if (declared.name && unused.has(declared.id))
      own.push(unusedDeclaration.at(declared.name.span, { name: declared.name.text }));
    return own.map((problem) => ({ problem, offset: declared.item.offset, declared }));
  });
}

function duplicate(document: Document, declared: Declared): readonly Problem[] {
  const { name, others } = namesakes(document, declared);
  if (!name || others.length === 0) return [];
  const related = others
    .slice(0, MOST_SHOWN)
    .map((other) => relatedTo({ document, declared: other }, 'declared here as well'));
  return [duplicateName.at(name.span, { name: name.text }, { related })];
}

/** The other declarations of the same name, or of the same condition. */
function namesakes({ declarations }: Document, declared: Declared): { name?: Name; others: readonly Declared[] } {
  const { declaration } = declared.item;
  if (declared.name) {
    const same = declarations.byName.get(declared.name.text) ?? [];
    return { name: declared.name, others: same.filter((other) => other !== declared) };
  }
  if (declaration.kind !== 'assume' || declaration.name.kind !== 'name') return { others: [] };
  const first = declarations.assumed.get(declaration.name.text);
  return { name: declaration.name, others: first && first !== declared ? [first] : [] };
}

function circular(place: Place, evaluation: Evaluation): readonly Problem[] {
  const circle = evaluation.circleOf(place);
  if (!circle) return [];
  const { declared } = place;
  const round = roundFrom(place, circle, (document, name) => evaluation.find(document, name));
  const related = round.slice(1, 1 + MOST_SHOWN).map((each) => relatedTo(each, 'part of the circle'));
  const span = (declared.name ?? declared.item.declaration).span;
  return [circularDefinition.at(span, { round: round.map((each) => each.declared.id) }, { related })];
}

function relatedTo({ document, declared }: Place, message: string): Related {
  const { start, end } = (declared.name ?? declared.item.declaration).span;
  return { message, uri: document.uri, offset: declared.item.offset + start, length: end - start };
}

const unusedByShape = new WeakMap<Shape, ReadonlySet<string>>();

/** Definitions that nothing reads, by their identity. A file of definitions alone is there to be used by others. */
function unusedDeclarations({ declarations, file, shape }: Document): ReadonlySet<string> {
  const before = unusedByShape.get(shape);
  if (before) return before;
  const used = new Set(
    declarations.all.flatMap(({ item, name }) =>
      references(item.declaration).flatMap(({ text }) => (text === name?.text ? [] : [text])),
    ),
  );
  const idle = declarations.all.filter(
    (declared) => isDefinition(declared) && declared.name && !used.has(declared.name.text),
  );
  const found = new Set(file.items.some(givesResults) ? idle.map(({ id }) => id) : []);
  unusedByShape.set(shape, found);
  return found;
}

function isDefinition({ item }: Declared): boolean {
  const { kind, word } = item.declaration;
  return kind === 'let' || kind === 'gas' || word.text === 'species';
}

function givesResults({ declaration: { kind, word } }: Item): boolean {
  return kind === 'require' || kind === 'site' || (kind === 'thing' && word.text !== 'species');
}
