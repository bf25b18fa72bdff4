import type { Analysis } from '../model/analysis';
import type { Declared } from '../model/declare';
import { hintResults } from '../model/kinds/list';
import { describeVerdict } from '../model/requirement';
import { resultNamed } from '../model/results';
import type { ShowOptions } from '../model/quantity';
import { show, showWithTolerance } from '../model/quantity';
import { halfWidth } from '../model/tolerance';
import type { Members, Quantity, Value, Verdict } from '../model/values';
import { parseUnit } from '../quantities/parseUnit';
import type { Declaration, Expression } from '../syntax/nodes';
import { describeFigure, showing } from './describe/describe';
import { describeStatus } from './describe/describeStatus';
import { code, plainText } from './hover/hoverMarkdown';

export interface HintSettings {
  readonly enabled: 'all' | 'failing' | 'off';
  /** The results to show by the word of a declaration, in place of those of its kind. */
  readonly figures: Readonly<{ [word: string]: readonly string[] }>;
  /** Significant digits. */
  readonly digits: number;
}

export interface Hint {
  readonly offset: number;
  readonly label: string;
  /** Markdown. */
  readonly tooltip: string;
  readonly kind: 'figures' | 'value' | 'verdict';
}

/** The editor cuts a line's hints at 43 characters; this leaves room for the hints of others. */
export const longestHint = 32;

/** What each declaration comes to, at the end of the line where it opens: never inside a row, at most one a line. */
export function inlayHints(
  analysis: Analysis,
  { start, end }: { readonly start: number; readonly end: number },
  settings: HintSettings,
): readonly Hint[] {
  if (settings.enabled === 'off') return [];
  const hints = new Map<number, Hint>();
  for (const declared of analysis.declared) {
    if (settings.enabled === 'failing' && declared.item.declaration.kind !== 'require') continue;
    const offset = placeOf(analysis.text, declared);
    if (offset < start || offset > end || hints.has(offset)) continue;
    const content = contentOf(analysis, declared, settings);
    if (content && content.label.length <= longestHint) hints.set(offset, { offset, ...content });
  }
  return [...hints.values()];
}

type Content = Omit<Hint, 'offset'>;

function placeOf(text: string, { item }: Declared): number {
  const { declaration, offset } = item;
  const block = declaration.kind === 'thing' ? declaration.block : undefined;
  const last = offset + (block ? block.span.start : declaration.span.end);
  lineEnd.lastIndex = last;
  return lineEnd.exec(text)?.index ?? text.length;
}

const lineEnd = /[\r\n]/g;

function contentOf(analysis: Analysis, declared: Declared, settings: HintSettings): Content | undefined {
  const outcome = analysis.outcome(declared);
  if (outcome.kind !== 'value') return undefined;
  const { declaration } = declared.item;
  const { value } = outcome;
  if (declaration.kind === 'assume') return undefined;
  if (value.kind === 'verdict') return verdictContent(analysis, declared, value, settings);
  const options = { ...showing(analysis, declared), digits: settings.digits };
  if (declaration.kind === 'let' && isReadable(declaration.value)) return undefined;
  return valueContent(value, wordOf(declaration, value), options, settings);
}

function wordOf({ word }: Declaration, value: Value): string {
  if (value.kind === 'record') return value.word;
  return value.kind === 'gas' ? 'gas' : word.text;
}

function verdictContent(
  analysis: Analysis,
  { item }: Declared,
  verdict: Verdict,
  { enabled }: HintSettings,
): Content | undefined {
  if (enabled === 'failing' && verdict.status === 'holds') return undefined;
  const { declaration, text } = item;
  const condition =
    declaration.kind === 'require' ? declaration.condition : declaration.kind === 'let' ? declaration.value : undefined;
  const found = condition ? plainText(describeVerdict(verdict, condition, text, analysis.display)) : '';
  return { label: describeStatus(verdict), tooltip: found, kind: 'verdict' };
}

function valueContent(
  value: Value,
  word: string,
  options: ShowOptions,
  { figures }: HintSettings,
): Content | undefined {
  switch (value.kind) {
    case 'quantity':
      return quantityContent(value, options);
    case 'word':
      return { label: `= ${value.text}`, tooltip: '', kind: 'value' };
    case 'record':
    case 'gas':
      return figuresContent(value.members, figures[word] ?? hintResults(word), options);
    case 'phrase':
    case 'table':
    case 'named-table':
    case 'pending':
    case 'verdict':
      return undefined;
  }
}

function quantityContent(value: Quantity, options: ShowOptions): Content {
  const alone = `= ${show(value, options)}`;
  const whole = `= ${showWithTolerance(value, options)}`;
  const tooltip = halfWidth(value.leans) > 0 ? `${plainText(whole.slice(2))}, at 95 % coverage` : '';
  return { label: whole.length <= longestHint ? whole : alone, tooltip, kind: 'value' };
}

/** As many figures as fit, the first ones first. */
function figuresContent(members: Members, names: readonly string[], options: ShowOptions): Content | undefined {
  let label = '';
  const lines: string[] = [];
  for (const name of names) {
    const figure = members.get(name);
    if (figure?.kind !== 'figure') continue;
    const { symbol } = resultNamed(name) ?? {};
    const text = figure.value.kind === 'word' ? figure.value.text : show(figure.value, options);
    const longer = [...(label === '' ? [] : [label]), symbol === undefined ? text : `${symbol} ${text}`].join(' · ');
    if (longer.length <= longestHint) label = longer;
    const row = describeFigure(name, figure, options);
    lines.push(`${code(name)}: ${plainText(row.text)}, ${plainText(row.method)}`);
  }
  return label === '' ? undefined : { label, tooltip: lines.join('\n\n'), kind: 'figures' };
}

/** Whether the text itself says the value: a literal, with or without a sign and a tolerance. A gauge pressure does not. */
function isReadable(node: Expression): boolean {
  switch (node.kind) {
    case 'number': {
      const unit = node.unit && parseUnit(node.unit.text);
      return !(unit?.ok && unit.unit.kind === 'gauge');
    }
    case 'text':
      return true;
    case 'unary':
      return isReadable(node.operand);
    case 'group':
      return isReadable(node.inner);
    case 'tolerance':
      return isReadable(node.value) && isReadable(node.halfWidth);
    default:
      return false;
  }
}
