import type { DocumentSymbol, FoldingRange, SelectionRange, SymbolInformation } from 'vscode-languageserver';
import { folding } from '../../features/folding';
import { links } from '../../features/links';
import { outline } from '../../features/outline';
import { selectionRanges } from '../../features/selectionRanges';
import { toFoldingRange } from '../convert/folding';
import { toOffset, toRange } from '../convert/range';
import { toDocumentSymbol, toSymbolInformation } from '../convert/symbol';
import type { Session } from '../session';
import { onFile } from './onFile';

/** How a file is built: its outline, and what can be folded, selected and followed. */
export function handleStructure(session: Session): void {
  const { connection, documents } = session;
  const about = onFile(session);

  connection.onDocumentSymbol(
    about('documentSymbol', [], ({ document, analysis }): DocumentSymbol[] | SymbolInformation[] => {
      const items = outline(analysis);
      return session.abilities.nestedSymbols
        ? items.map((item) => toDocumentSymbol(document, item))
        : items.map((item) => toSymbolInformation(document, item));
    }),
  );

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
