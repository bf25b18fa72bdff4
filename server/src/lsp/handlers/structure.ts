import type { FoldingRange, SelectionRange } from 'vscode-languageserver';
import { folding } from '../../features/folding';
import { links } from '../../features/links';
import { selectionRanges } from '../../features/selectionRanges';
import { toFoldingRange } from '../convert/folding';
import { toOffset, toRange } from '../convert/range';
import type { Session } from '../session';
import { onFile } from './onFile';

/** How a file is built: what can be folded, selected and followed. */
export function handleStructure(session: Session): void {
  const { connection, documents } = session;
  const about = onFile(session);

  connection.onFoldingRanges(
    about('foldingRange', [], ({ document, analysis }): FoldingRange[] =>
      folding(analysis).map((each) => toFoldingRange(document, each)),
    ),
  );

  connection.onSelectionRanges(
    about('selectionRange', [], ({ document, analysis }, { positions }) =>
      positions.map((position): SelectionRange => {
        const inside = selectionRanges(analysis, toOffset(document, position)).map((each) => toRange(document, each));
        const nested = inside.reduceRight<SelectionRange | undefined>(
          (parent, range) => (parent ? { range, parent } : { range }),
          undefined,
        );
        return nested ?? { range: { start: position, end: position } };
      }),
    ),
  );

  connection.onDocumentLinks(
    about('documentLink', [], ({ document, analysis }) =>
      links(analysis).map(({ target, ...place }) => ({
        range: toRange(document, place),
        target: documents.get(target)?.uri ?? target,
      })),
    ),
  );
}
