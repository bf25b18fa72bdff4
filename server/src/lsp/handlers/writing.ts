import type { CodeAction as ProtocolAction } from 'vscode-languageserver';
import { codeActions, fixAll } from '../../features/codeActions';
import { completion } from '../../features/completion/completion';
import { format } from '../../features/format/format';
import { fixAllKind, isAsked, toCodeAction } from '../convert/codeAction';
import { toCompletionItem } from '../convert/completion';
import { toTextEdit, toWorkspaceEdit } from '../convert/edit';
import { toOffset, toStretch } from '../convert/range';
import type { Session } from '../session';
import type { KnownFile } from './onFile';
import { onFile } from './onFile';

/** Help with writing: what could stand here, what mends a problem, and the usual form. */
export function handleWriting(session: Session): void {
  const { connection } = session;
  const about = onFile(session);

  connection.onCompletion(
    about('completion', [], ({ document, analysis }, { position }) =>
      completion(analysis, toOffset(document, position)).map((item) =>
        toCompletionItem(document, item, session.abilities),
      ),
    ),
  );

  connection.onCodeAction(
    about('codeAction', [], ({ document, analysis }, { range, context }): ProtocolAction[] => {
      const actions = codeActions(analysis, toStretch(document, range))
        .filter(({ kind }) => isAsked(kind, context.only))
        .map((action) => toCodeAction(document, action, { session, diagnostics: context.diagnostics }));
      const all = isAsked(fixAllKind, context.only) ? fixAll(analysis) : [];
      if (all.length === 0) return actions;
      const edit = toWorkspaceEdit(new Map([[document.uri, all]]), session);
      return [...actions, { title: 'Fix all that has one clear fix', kind: fixAllKind, edit }];
    }),
  );

  const formatted = ({ document }: KnownFile, range?: { start: number; end: number }) =>
    format(document.getText(), range ? { range } : {}).map((edit) => toTextEdit(document, edit));

  connection.onDocumentFormatting(about('formatting', [], (file) => formatted(file)));
  connection.onDocumentRangeFormatting(
    about('rangeFormatting', [], (file, { range }) => formatted(file, toStretch(file.document, range))),
  );
  connection.onDocumentOnTypeFormatting(
    about('onTypeFormatting', [], (file, { position, ch }) => {
      const { document, analysis } = file;
      const offset = toOffset(document, position);
      // After a new line the one above is done; a closing brace ends its whole declaration.
      if (ch === '\n') return formatted(file, lineAbove(document.getText(), offset));
      const item = analysis.file.items.find((each) => each.offset < offset && offset <= each.offset + each.text.length);
      return item ? formatted(file, { start: item.offset, end: item.offset + item.text.length }) : [];
    }),
  );
}

function lineAbove(text: string, offset: number): { start: number; end: number } {
  const end = Math.max(0, text.lastIndexOf('\n', offset - 1));
  return { start: end, end };
}
