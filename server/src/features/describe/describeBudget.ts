import type { Analysis } from '../../model/analysis';
import type { Declared } from '../../model/declare';
import { builtInGas } from '../../model/mixture';
import { dataTitle, spoken } from '../../model/reasons';
import type { Gas } from '../../model/values';
import type { Leans } from '../../model/tolerance';
import { budget } from '../../model/tolerance';
import { constantNamed } from '../../quantities/constants';
import { walk } from '../../syntax/children';
import type { Declaration, Tolerance } from '../../syntax/nodes';
import { describePercent } from './describePercent';

export interface BudgetRow {
  /** The cause in words: `room ± 2 K`, `stated error of the viscosity of N2`. */
  readonly cause: string;
  /** Its share of the variance, from 0 to 1. */
  readonly share: number;
  readonly text: string;
}

/** Which inputs and methods bring the tolerance of a value, largest first. */
export function describeBudget(analysis: Analysis, leans: Leans, { most = 3 } = {}): readonly BudgetRow[] {
  return budget(leans)
    .slice(0, most)
    .map(({ cause, share }) => ({ cause: describeCause(analysis, cause), share, text: describePercent(share) }));
}

/** What a cause of tolerance is called: a number of a file, a correlation, a method or a constant. */
export function describeCause(analysis: Analysis, cause: string): string {
  const mark = cause.indexOf('#');
  if (mark >= 0) return inputCause(analysis, cause.slice(0, mark), cause.slice(mark + 1));
  if (cause.startsWith('const.')) return `the ${constantNamed(cause.slice('const.'.length))?.title ?? cause}`;
  const [data = '', formula] = cause.split(':');
  return formula === undefined ? (methodCauses.get(data) ?? spoken(data)) : dataCause(data, formula);
}

/** Methods whose own error enters a result. */
const methodCauses: ReadonlyMap<string, string> = new Map([
  ['second_virial', 'error of the second virial coefficient'],
  ['fuller_diffusion', 'error of the diffusivities from the volumes of the atoms'],
  ['eucken', 'error of the Eucken relation'],
  ['monatomic_conductivity', 'error of the conductivity from the viscosity'],
  ['mixture_viscosity', 'error of the mixing rule for viscosity'],
  ['mixture_conductivity', 'error of the mixing rule for conductivity'],
  ['self_diffusion', 'error of the diffusivity from the viscosity'],
  ['measured_diffusion', 'error of the measured diffusivities'],
  ['pair_diffusion', 'error of the estimated diffusivities'],
  ['series_rule', 'error of the rule for passages in series'],
  ['heat_transition', 'error of the conduction between its limits'],
]);

function dataCause(data: string, formula: string): string {
  if (data === 'transmission')
    return `error of the transmission probability of a ${formula}`.replace(/a (?=[aeiou]\w*$)/, 'an ');
  if (!isDataWithError(data)) return `${spoken(data)} of ${formula}`;
  const [species] = builtInGas(formula)?.composition.species ?? [];
  const stated = species && dataWithError[data](species).every((known) => known?.uncertainty !== undefined);
  return `${stated ? 'stated' : 'assumed'} error of the ${dataTitle(data)} of ${formula}`;
}

type Species = Gas['composition']['species'][number];

/** The data of a species whose own error enters a result. */
const dataWithError = {
  viscosity: ({ viscosity }: Species) => [viscosity],
  conductivity: ({ conductivity }: Species) => [conductivity],
  heat_capacity: ({ heatCapacity }: Species) => [heatCapacity],
  saturation_pressure: ({ saturation = [] }: Species) => saturation,
};

function isDataWithError(data: string): data is keyof typeof dataWithError {
  return Object.hasOwn(dataWithError, data);
}

/** `residual.pressure` → `pressure of residual ± 10 %`, the half-width as the author wrote it. */
function inputCause(analysis: Analysis, uri: string, rest: string): string {
  const declared = uri === analysis.uri ? ownOf(analysis, rest) : foreignOf(analysis, uri, rest);
  if (!declared) return `${rest} in ${fileName(uri)}`;
  const [key = '', count = '1'] = rest.slice(declared.id.length).replace(/^\./, '').split('~');
  const { declaration, text } = declared.item;
  const node = tolerancesOf(declaration, key)[Number(count) - 1];
  const width = node ? ` ± ${text.slice(node.halfWidth.span.start, node.halfWidth.span.end)}` : '';
  const name = declared.name?.text ?? wordsOf(declaration);
  const place = uri === analysis.uri ? '' : ` in ${fileName(uri)}`;
  return `${key === '' ? name : `${key} of ${name}`}${width}${place}`;
}

function ownOf({ declared }: Analysis, rest: string): Declared | undefined {
  const fits = ({ id }: Declared) => rest === id || rest.startsWith(`${id}.`) || rest.startsWith(`${id}~`);
  return declared.filter(fits).reduce<Declared | undefined>(longer, undefined);
}

/** `room~2` is the second declaration of that name rather than the second number of the first. */
function longer(a: Declared | undefined, b: Declared): Declared {
  return a && a.id.length > b.id.length ? a : b;
}

function foreignOf(analysis: Analysis, uri: string, rest: string): Declared | undefined {
  const place = analysis.find(rest.replace(/[.~].*$/su, ''));
  return place?.document.uri === uri ? place.declared : undefined;
}

function wordsOf(declaration: Declaration): string {
  if (declaration.kind === 'assume' && declaration.name.kind === 'name') return declaration.name.text;
  return declaration.kind === 'require' ? 'the requirement' : declaration.word.text;
}

function tolerancesOf(declaration: Declaration, key: string): readonly Tolerance[] {
  const found = new Map<Tolerance, string>();
  walk(declaration, (node) => {
    if (node.kind === 'tolerance' && !found.has(node)) found.set(node, '');
    if (node.kind === 'entry')
      walk(node, (inner) => {
        if (inner.kind === 'tolerance') found.set(inner, node.key.text);
      });
  });
  return [...found].flatMap(([node, owner]) => (owner === key ? [node] : []));
}

function fileName(uri: string): string {
  return uri.slice(uri.lastIndexOf('/') + 1);
}
