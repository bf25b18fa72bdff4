import type { Analysis } from '../model/analysis';
import { functionNamed } from '../model/functions';
import type { TableValue } from '../model/values';
import { describeDimension } from '../quantities/quantityKinds';
import type { Span } from '../syntax/nodes';

/** How the function around the cursor is called. */
export interface SignatureHelp {
  readonly usage: string;
  readonly meaning: string;
  /** Where the parameters stand in the usage. */
  readonly parameters: readonly Span[];
  /** Which one is being written, from zero; the last one may repeat. */
  readonly active: number;
}

export function signatureHelp(analysis: Analysis, offset: number): SignatureHelp | undefined {
  const call = callAround(analysis, offset);
  if (!call) return undefined;
  const definition = functionNamed(call.callee);
  if (definition) return signature(definition.usage, definition.meaning, call.argument);
  const place = analysis.find(call.callee);
  const [declared] = place ? [analysis.scope(place.declared).lookUp(call.callee)] : [];
  if (declared?.kind !== 'found' || declared.value.kind !== 'table') return undefined;
  return signature(`${call.callee}(x)`, tableMeaning(declared.value), call.argument);
}

interface OpenCall {
  readonly callee: string;
  /** Which argument is being written, from zero. */
  readonly argument: number;
}

/** A call is half-typed when help is wanted, so the text up to the cursor is read, not the tree. */
function callAround({ text, file }: Analysis, offset: number): OpenCall | undefined {
  const start = file.items.filter((item) => item.offset <= offset).at(-1)?.offset ?? offset;
  const open: { readonly mark: string; readonly callee: string; argument: number }[] = [];
  for (const { 0: token, groups } of text.slice(start, offset).matchAll(TOKEN)) {
    if (/[([{]$/.test(token)) open.push({ mark: token.slice(-1), callee: groups?.['callee'] ?? '', argument: 0 });
    else if (/[)\]}]/.test(token)) open.pop();
    else if (token === ',') count(open.at(-1));
    else if (/["#]/.test(token) && isUnfinished(token, text, offset)) return undefined;
  }
  while (open.at(-1)?.mark === '(' && open.at(-1)?.callee === '') open.pop();
  const call = open.at(-1);
  return call && call.callee !== '' ? call : undefined;
}

const TOKEN = /"[^"\n]*"?|#[^\n]*|(?<callee>[\p{L}_][\p{L}\p{N}_]*)\(|[()[\]{},]/gu;

/** The cursor stands in a text or a comment. */
function isUnfinished(token: string, text: string, offset: number): boolean {
  return text.slice(0, offset).endsWith(token) && !/^".*"$/.test(token);
}

function count(call: { argument: number } | undefined): void {
  if (call) call.argument += 1;
}

function signature(usage: string, meaning: string, argument: number): SignatureHelp {
  const list = usage.indexOf('(') + 1;
  const parameters = [...usage.slice(list, -1).matchAll(/[^, ]+/g)].map(({ index, 0: text }) => ({
    start: list + index,
    end: list + index + text.length,
  }));
  return { usage, meaning, parameters, active: Math.min(argument, parameters.length - 1) };
}

function tableMeaning({ rows }: TableValue): string {
  const [row] = rows;
  if (!row) return 'a table';
  return `a table: ${describeDimension(row.value.dimension)} at ${describeDimension(row.at.dimension)}`;
}
