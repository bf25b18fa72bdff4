import type { Stage } from '../../physics/passages/composite';
import { inParallel, inSeries, seriesError } from '../../physics/passages/composite';
import { transmissionSources } from '../../physics/passages/transmission';
import type { LineDeclaration, Name, Route } from '../../syntax/nodes';
import { add } from '../arithmetic';
import { describeValue } from '../expression';
import { figure, figures } from '../figures';
import { evaluateName } from '../member';
import { wrongType } from '../problems/wrongType';
import { propagate } from '../propagate';
import { plainNumber } from '../quantity';
import { citation } from '../reasons';
import type { Scope } from '../scope';
import { exact } from '../tolerance';
import type { Figure, Members, Quantity, Record, Value } from '../values';

/** What gas can be led through. */
export const passageWords: readonly string[] = [
  ...['orifice', 'tube', 'duct', 'slit', 'annulus', 'cone', 'bend', 'bundle', 'plug'],
  'line',
];

/** Passages one after the other and side by side. */
export function evaluateLine({ route, word }: LineDeclaration, scope: Scope): Value | undefined {
  const path = readPath(route, scope);
  if (path === undefined) return undefined;
  return path === 'pending' ? { kind: 'pending', word: word.text } : lineOf(path);
}

/** Whether every name on a route is a passage. */
export function checkRoute(route: Route | { kind: 'mixture' }, scope: Scope): boolean {
  return route.kind !== 'mixture' && readPath(route, scope) !== undefined;
}

type Path =
  | { readonly kind: 'passage'; readonly record: Record }
  | { readonly kind: 'series' | 'parallel'; readonly parts: readonly Path[] };

function readPath(route: Route, scope: Scope): Path | 'pending' | undefined {
  switch (route.kind) {
    case 'series':
      return joined('series', route.stages, scope);
    case 'parallel':
      return joined('parallel', route.branches, scope);
    case 'name':
      return readPassage(route, scope);
    case 'hole':
      return undefined;
    default:
      return route satisfies never;
  }
}

function joined(kind: 'series' | 'parallel', routes: readonly Route[], scope: Scope): Path | 'pending' | undefined {
  const read = routes.map((each) => readPath(each, scope));
  if (read.includes(undefined)) return undefined;
  return read.includes('pending')
    ? 'pending'
    : { kind, parts: read.filter((path) => path !== 'pending' && path !== undefined) };
}

function readPassage(name: Name, scope: Scope): Path | 'pending' | undefined {
  const value = evaluateName(name, scope, 'passage');
  if (!value) return undefined;
  if ((value.kind === 'record' || value.kind === 'pending') && passageWords.includes(value.word)) {
    return value.kind === 'record' ? { kind: 'passage', record: value } : 'pending';
  }
  scope.report(wrongType.at(name.span, { subject: 'this place', wants: 'a passage', found: describeValue(value) }));
  return undefined;
}

function lineOf(path: Path): Record {
  const records = recordsOf(path);
  const opening = (name: string): Quantity | undefined => areaAt(path, name);
  const [area, outlet] = [opening('area'), opening('outlet_area')];
  const [volume, walls] = [sumOf(records, 'volume'), sumOf(records, 'wall_area')];
  const size = narrowest(records);
  const members: Members = new Map([
    ...figures('the openings at the ends of the line', {
      ...(area ? { area } : {}),
      ...(outlet ? { outlet_area: outlet } : {}),
    }),
    ...figures('the sum over the passages', {
      ...(volume ? { volume } : {}),
      ...(walls ? { wall_area: walls } : {}),
    }),
    ...(size ? figures('that of the narrowest passage', { characteristic_length: size }) : []),
    [TRANSMISSION, transmissionOf(path, records)] as const,
  ]);
  return { kind: 'record', word: 'line', members, species: new Map(), inputs: new Map() };
}

const TRANSMISSION = 'transmission_probability';

function recordsOf(path: Path): readonly Record[] {
  return path.kind === 'passage' ? [path.record] : path.parts.flatMap(recordsOf);
}

/** The area at one end: of the first or last stage, of all branches together. */
function areaAt(path: Path, name: string): Quantity | undefined {
  if (path.kind === 'passage') return quantityOf(path.record, name) ?? quantityOf(path.record, 'area');
  const parts = path.kind === 'parallel' ? path.parts : path.parts.slice(...(name === 'area' ? [0, 1] : [-1]));
  return total(parts.map((part) => areaAt(part, name)));
}

function sumOf(records: readonly Record[], name: string): Quantity | undefined {
  return total(records.map((record) => quantityOf(record, name)));
}

/** Nothing where a part is not known. */
function total(parts: readonly (Quantity | undefined)[]): Quantity | undefined {
  return parts.reduce((sum, part) => sum && part && add(sum, part));
}

function narrowest(records: readonly Record[]): Quantity | undefined {
  const sizes = records.flatMap((record) => quantityOf(record, 'characteristic_length') ?? []);
  return sizes.reduce<Quantity | undefined>((least, size) => (least && least.si <= size.si ? least : size), undefined);
}

/** The published rules for conductances in series and side by side, with their own error where there is a junction. */
function transmissionOf(path: Path, records: readonly Record[]): Figure {
  const lacking = records.map((record) => record.members.get(TRANSMISSION)).find((each) => each?.kind === 'absent');
  if (lacking) return lacking;
  const inputs = records.flatMap((record) => [
    quantityOf(record, 'area') ?? plainNumber(NaN),
    quantityOf(record, 'outlet_area') ?? quantityOf(record, 'area') ?? plainNumber(NaN),
    quantityOf(record, TRANSMISSION) ?? plainNumber(NaN),
  ]);
  const error = seriesError(junctionsOf(path));
  const { result, leans } = propagate<number>({
    inputs,
    run: (numbers, factors) => chanceOf(path, numbers) * (factors.get(ERROR) ?? 1),
    errorsOf: () => (error > 0 ? [{ key: ERROR, relative: error }] : []),
    valuesOf: (value) => new Map([[TRANSMISSION, value]]),
  });
  const value = { ...plainNumber(result), leans: leans.get(TRANSMISSION) ?? exact, quantityKind: 'number' };
  return figure(value, {
    method: `free-molecular: ${error > 0 ? SERIES : PARALLEL}; each passage by its own method`,
    sources: error > 0 ? transmissionSources.series.map(citation) : [],
    assumptions: error > 0 ? ['the gas is mixed again between the passages, which holds within 5 to 10 %'] : [],
  });
}

const ERROR = 'series_rule';
const SERIES = 'passages in series by adding what they hold back, side by side by adding what they let through';
const PARALLEL = 'passages side by side by adding what they let through';

function junctionsOf(path: Path): number {
  if (path.kind === 'passage') return 0;
  const own = path.kind === 'series' ? path.parts.length - 1 : 0;
  return path.parts.reduce((sum, part) => sum + junctionsOf(part), own);
}

/** The transmission probability from the inlet; three numbers for each passage, in order. */
function chanceOf(path: Path, numbers: readonly number[]): number {
  const rest = [...numbers];
  const stageOf = (part: Path): Stage => {
    if (part.kind === 'passage') {
      const [inlet = NaN, outlet = NaN, chance = NaN] = rest.splice(0, 3);
      return { inlet, outlet, through: inlet * chance };
    }
    const stages = part.parts.map(stageOf);
    return part.kind === 'series' ? inSeries(stages) : inParallel(stages);
  };
  const { inlet, through } = stageOf(path);
  return through / inlet;
}

function quantityOf(record: Record, name: string): Quantity | undefined {
  const found = record.members.get(name);
  return found?.kind === 'figure' && found.value.kind === 'quantity' ? found.value : undefined;
}
