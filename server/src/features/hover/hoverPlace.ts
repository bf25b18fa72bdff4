import type { Analysis } from '../../model/analysis';
import type { Declared } from '../../model/declare';
import type { ShowOptions } from '../../model/quantity';
import type { DeclarationScope } from '../../model/scope';
import type { Node } from '../../syntax/nodes';

/** Where the pointer rests: the declaration, and the nodes from it down to what is touched. */
export interface HoverPlace {
  readonly analysis: Analysis;
  readonly declared: Declared;
  /** Outermost first; the last is what is touched. */
  readonly path: readonly Node[];
  readonly scope: DeclarationScope;
  readonly options: ShowOptions;
  readonly detail: 'brief' | 'full';
}
