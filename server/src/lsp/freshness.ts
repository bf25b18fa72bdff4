import type { Analysis } from '../model/analysis';
import { diagnostics } from '../features/diagnostics';
import { semanticTokens } from '../features/semanticTokens';
import { canonical } from './address';
import { toDiagnostic } from './convert/diagnostic';
import { createSchedule } from './schedule';
import type { Session } from './session';

/** Keeps what the client shows right: publishes problems, and asks it to ask again where an answer no longer holds. */
export interface Freshness {
  /** A text is new; so may be everything that uses it. */
  changed(uri: string, delay?: number): void;
  closed(uri: string): void;
  /** Hints look different now, whatever they show. */
  settingsChanged(): void;
  /** The client shows something made from this analysis. */
  answered(kind: Shown, analysis: Analysis): void;
}

type Shown = 'hints' | 'diagnostics' | 'tokens';

export function createFreshness(session: Session): Freshness {
  const { connection, documents } = session;
  const shown: Record<Shown, Map<string, Analysis>> = {
    hints: new Map(),
    diagnostics: new Map(),
    tokens: new Map(),
  };
  const stale = new Set<Shown>();

  /** What has changed in the file itself the client asks for by itself; here it is about the files that it uses. */
  const compare = (kind: Shown, now: Analysis, differs: (before: Analysis, now: Analysis) => boolean) => {
    const before = shown[kind].get(now.uri);
    if (!before || before === now || before.text !== now.text) return;
    if (differs(before, now)) stale.add(kind);
    shown[kind].set(now.uri, now);
  };

  const publish = (analysis: Analysis) => {
    const document = documents.get(analysis.uri);
    if (!document) return;
    void connection.sendDiagnostics({
      uri: document.uri,
      version: document.version,
      diagnostics: diagnostics(analysis).map((each) => toDiagnostic(document, each, session)),
    });
  };

  const refresh = () => {
    // A client that refuses to ask again is none of the user's concern.
    const ask = (request: Promise<void>) => void request.catch(() => undefined);
    if (stale.has('hints') && session.abilities.refreshesHints) ask(connection.languages.inlayHint.refresh());
    if (stale.has('diagnostics') && session.abilities.refreshesDiagnostics) {
      ask(connection.languages.diagnostics.refresh());
    }
    if (stale.has('tokens') && session.abilities.refreshesTokens) ask(connection.languages.semanticTokens.refresh());
    stale.clear();
  };

  const schedule = createSchedule({
    runtime: session.runtime,
    *work(uri) {
      if (!documents.isOpen(uri)) return;
      yield documents.settled(uri);
      const analysis = documents.analyse(uri);
      yield undefined;
      compare('hints', analysis, valuesDiffer);
      compare('diagnostics', analysis, problemsDiffer);
      compare('tokens', analysis, tokensDiffer);
      if (!session.abilities.pullsDiagnostics) publish(analysis);
    },
    onIdle: refresh,
    onFault: (uri, error) => session.guard.report(`problems of ${uri}`, error),
  });

  return {
    changed: (uri, delay) => {
      const all = [canonical(uri), ...documents.dependants(uri)];
      for (const each of all) if (documents.isOpen(each)) schedule.touch(each, delay);
    },
    closed: (uri) => {
      const key = canonical(uri);
      schedule.drop(key);
      for (const answers of Object.values(shown)) answers.delete(key);
      if (!session.abilities.pullsDiagnostics) void connection.sendDiagnostics({ uri, diagnostics: [] });
    },
    settingsChanged: () => {
      stale.add('hints');
      refresh();
    },
    answered: (kind, analysis) => shown[kind].set(analysis.uri, analysis),
  };
}

/** The same text, so the same declarations; equal values are the same object. */
function valuesDiffer(before: Analysis, now: Analysis): boolean {
  return now.declared.some((declared, index) => {
    const earlier = before.declared[index];
    return !earlier || before.outcome(earlier) !== now.outcome(declared);
  });
}

function problemsDiffer(before: Analysis, now: Analysis): boolean {
  return JSON.stringify(diagnostics(before)) !== JSON.stringify(diagnostics(now));
}

function tokensDiffer(before: Analysis, now: Analysis): boolean {
  return JSON.stringify(semanticTokens(before)) !== JSON.stringify(semanticTokens(now));
}
