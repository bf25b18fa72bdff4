import type { FoldingRange as ProtocolRange } from 'vscode-languageserver';
import { FoldingRangeKind } from 'vscode-languageserver';
import type { TextDocument } from 'vscode-languageserver-textdocument';
import type { FoldingRange } from '../../features/folding';

const kinds: Readonly<Record<FoldingRange['kind'], FoldingRangeKind | undefined>> = {
  block: undefined,
  comment: FoldingRangeKind.Comment,
  imports: FoldingRangeKind.Imports,
  region: FoldingRangeKind.Region,
};

export function toFoldingRange(document: TextDocument, { start, end, kind: sort }: FoldingRange): ProtocolRange {
  const kind = kinds[sort];
  return {
    startLine: document.positionAt(start).line,
    endLine: document.positionAt(end).line,
    ...(kind === undefined ? {} : { kind }),
  };
}
