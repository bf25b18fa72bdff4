import { hover } from '../../features/hover/hover';
import { inlayHints } from '../../features/inlayHints';
import { signatureHelp } from '../../features/signatureHelp';
import { toHint } from '../convert/hint';
import { toHover } from '../convert/hover';
import { toOffset, toStretch } from '../convert/range';
import { toSignatureHelp } from '../convert/signature';
import type { Freshness } from '../freshness';
import type { Session } from '../session';
import { onFile } from './onFile';

/** What a file comes to, and what is known of its words. */
export function handleValues(session: Session, freshness: Freshness): void {
  const { connection } = session;
  const about = onFile(session);

  connection.onHover(
    about('hover', null, ({ document, analysis }, { position }) => {
      const found = hover(analysis, toOffset(document, position), session.settings.hover);
      return found ? toHover(document, found, session.abilities) : null;
    }),
  );

  connection.languages.inlayHint.on(
    about('inlayHint', [], ({ document, analysis }, { range }) => {
      freshness.answered('hints', analysis);
      const hints = inlayHints(analysis, toStretch(document, range), session.settings.hints);
      return hints.map((hint) => toHint(document, hint));
    }),
  );

  connection.onSignatureHelp(
    about('signatureHelp', null, ({ document, analysis }, { position }) => {
      const found = signatureHelp(analysis, toOffset(document, position));
      return found ? toSignatureHelp(found, session.abilities) : null;
    }),
  );
}
