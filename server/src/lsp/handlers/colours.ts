import type { SemanticTokens } from 'vscode-languageserver';
import { SemanticTokensBuilder } from 'vscode-languageserver';
import { semanticTokens } from '../../features/semanticTokens';
import { toStretch } from '../convert/range';
import { pushTokens } from '../convert/tokens';
import type { Freshness } from '../freshness';
import type { Session } from '../session';
import type { KnownFile } from './onFile';
import { onFile } from './onFile';

const none: SemanticTokens = { data: [] };

/** Colours by meaning: of a whole file, of what is in sight, or what has changed since. */
export function handleColours(session: Session, freshness: Freshness): void {
  const { semanticTokens: requests } = session.connection.languages;
  const about = onFile(session);
  const builders = new WeakMap<KnownFile['document'], SemanticTokensBuilder>();

  const builderOf = ({ document }: KnownFile): SemanticTokensBuilder => {
    const builder = builders.get(document) ?? new SemanticTokensBuilder();
    builders.set(document, builder);
    return builder;
  };

  requests.on(
    about('semanticTokens', none, (file) => {
      freshness.answered('tokens', file.analysis);
      const builder = builderOf(file);
      builder.previousResult('');
      pushTokens(builder, file.document, semanticTokens(file.analysis));
      return builder.build();
    }),
  );

  requests.onDelta(
    about('semanticTokens/delta', none, (file, { previousResultId }) => {
      freshness.answered('tokens', file.analysis);
      const builder = builderOf(file);
      builder.previousResult(previousResultId);
      pushTokens(builder, file.document, semanticTokens(file.analysis));
      return builder.buildEdits();
    }),
  );

  requests.onRange(
    about('semanticTokens/range', none, ({ document, analysis }, { range }) => {
      freshness.answered('tokens', analysis);
      const builder = new SemanticTokensBuilder();
      pushTokens(builder, document, semanticTokens(analysis, { range: toStretch(document, range) }));
      return builder.build();
    }),
  );
}
