import type { Analysis } from '../model/analysis';

/** A requirement with what became of it. One whose inputs have no value is undecided. */
export interface RequirementRow {
  /** Where it stands in the file. */
  readonly offset: number;
  /** The condition, on one line. */
  readonly text: string;
  readonly strength: 'require' | 'prefer';
  readonly because?: string;
  readonly status: 'holds' | 'fails' | 'undecided';
  /** Whether it could be judged at all; if so, only the tolerances can leave it undecided. */
  readonly evaluated: boolean;
  readonly margin?: number;
}

export function requirementsOf(analysis: Analysis): readonly RequirementRow[] {
  return analysis.declared.flatMap((declared): RequirementRow[] => {
    const { item } = declared;
    const { declaration } = item;
    if (declaration.kind !== 'require') return [];
    const { condition, because, strength } = declaration;
    const outcome = analysis.outcome(declared);
    const verdict = outcome.kind === 'value' && outcome.value.kind === 'verdict' ? outcome.value : undefined;
    return [
      {
        offset: item.offset,
        text: item.text.slice(condition.span.start, condition.span.end).replace(/\s+/g, ' '),
        strength,
        ...(because?.kind === 'text' ? { because: because.text } : {}),
        status: verdict?.status ?? 'undecided',
        evaluated: verdict !== undefined,
        ...(verdict?.margin === undefined ? {} : { margin: verdict.margin }),
      },
    ];
  });
}
