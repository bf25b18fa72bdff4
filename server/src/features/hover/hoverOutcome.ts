import type { Analysis } from '../../model/analysis';
import type { Declared } from '../../model/declare';
import { plainText, shortened } from './hoverMarkdown';

/** Why a declaration has no results. */
export function noValueNote(analysis: Analysis, declared: Declared): string | undefined {
  switch (analysis.outcome(declared).kind) {
    case 'failed': {
      const own = analysis.problems().find((each) => each.declared === declared && each.problem.severity === 'error');
      return plainText(`No results: ${shortened(own?.problem.message ?? 'something in it is wrong', 300)}`);
    }
    case 'blocked':
      return 'No results yet: something it uses has no value.';
    case 'none':
    case 'value':
      return undefined;
  }
}
