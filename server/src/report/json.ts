import type { Analysis } from '../model/analysis';
import type { Declared } from '../model/declare';
import { kindOf } from '../model/quantity';
import { halfWidth } from '../model/tolerance';
import type { Figure, Members, Provenance, Quantity, Value, Word } from '../model/values';
import { coherentUnitText } from '../quantities/dimension';
import { lineIndex } from '../features/lines';
import type { Position } from '../features/lines';
import { problemsOf } from './problems';
import { requirementsOf } from './requirements';

/** What `check --format json` prints; check.schema.json states it for other programs. */
export interface JsonReport {
  readonly tenuity: string;
  readonly files: readonly JsonFile[];
}

export interface JsonFile {
  readonly file: string;
  readonly declarations: readonly JsonDeclaration[];
  readonly requirements: readonly JsonRequirement[];
  readonly diagnostics: readonly JsonDiagnostic[];
}

export interface JsonDeclaration {
  readonly name: string;
  readonly kind: string;
  readonly line: number;
  readonly results: JsonResults;
  /** The results of each species of a mixture. */
  readonly species?: Readonly<{ [formula: string]: JsonResults }>;
}

export type JsonResults = Readonly<{ [name: string]: JsonResult }>;

export interface JsonResult {
  /** In the coherent SI unit named by `unit`; a word, such as a regime, has none. */
  readonly value: number | string;
  readonly unit: string;
  /** The half-width at 95 % coverage, in the same unit. */
  readonly tolerance: number;
  readonly method: string;
  readonly source: string;
  readonly range?: string;
  readonly assumptions?: readonly string[];
}

export interface JsonRequirement {
  readonly line: number;
  readonly text: string;
  readonly strength: 'require' | 'prefer';
  readonly because?: string;
  readonly status: 'holds' | 'fails' | 'undecided';
  /** As a share of the limit; null where nothing is measured. */
  readonly margin: number | null;
}

export interface JsonDiagnostic {
  readonly code: string;
  readonly severity: string;
  readonly line: number;
  readonly column: number;
  readonly endLine: number;
  readonly endColumn: number;
  readonly message: string;
}

/** One file with everything computed of it. Lines and columns count from one. */
export function jsonFile(file: string, analysis: Analysis): JsonFile {
  const lines = lineIndex(analysis.text);
  return {
    file,
    declarations: analysis.declared.flatMap((declared) =>
      declarationOf(analysis, declared, lines.positionAt(declared.item.offset)),
    ),
    requirements: requirementsOf(analysis).map(({ offset, text, strength, because, status, margin }) => ({
      line: lines.positionAt(offset).line + 1,
      text,
      strength,
      ...(because === undefined ? {} : { because }),
      status,
      margin: margin ?? null,
    })),
    diagnostics: problemsOf(analysis).map(({ problem: { code, severity, message }, start, end }) => ({
      code,
      severity,
      line: start.line + 1,
      column: start.character + 1,
      endLine: end.line + 1,
      endColumn: end.character + 1,
      message,
    })),
  };
}

function declarationOf(analysis: Analysis, declared: Declared, { line }: Position): JsonDeclaration[] {
  const { name, item } = declared;
  if (!name) return [];
  const outcome = analysis.outcome(declared);
  const value = outcome.kind === 'value' ? outcome.value : undefined;
  const results = value ? resultsOf(value) : {};
  const species = value && (value.kind === 'record' || value.kind === 'gas') ? [...value.species] : [];
  return [
    {
      name: name.text,
      kind: item.declaration.word.text,
      line: line + 1,
      results,
      ...(species.length > 0
        ? { species: Object.fromEntries(species.map(([formula, members]) => [formula, membersOf(members)])) }
        : {}),
    },
  ];
}

function resultsOf(value: Value): JsonResults {
  switch (value.kind) {
    case 'quantity':
    case 'word':
      return { value: resultOf(value, { method: 'as declared', sources: [], assumptions: [] }) };
    case 'record':
    case 'gas':
      return membersOf(value.members);
    case 'phrase':
    case 'table':
    case 'named-table':
    case 'verdict':
    case 'pending':
      return {};
  }
}

function membersOf(members: Members): JsonResults {
  const figures = [...members].filter(
    (entry): entry is [string, Extract<Figure, { kind: 'figure' }>] => entry[1].kind === 'figure',
  );
  return Object.fromEntries(figures.map(([name, { value, provenance }]) => [name, resultOf(value, provenance)]));
}

function resultOf(value: Quantity | Word, { method, sources, range, assumptions }: Provenance): JsonResult {
  const shown =
    value.kind === 'word'
      ? { value: value.text, unit: '', tolerance: 0 }
      : {
          value: value.si,
          unit: kindOf(value)?.unit ?? coherentUnitText(value.dimension),
          tolerance: halfWidth(value.leans),
        };
  return {
    ...shown,
    method,
    source: sources.join('; '),
    ...(range === undefined ? {} : { range }),
    ...(assumptions.length > 0 ? { assumptions } : {}),
  };
}
